import type { JSX } from 'react'
import type { Status, Verdict } from '../../../shared/report/report.ts'
import { csvText, saveText } from '../../lib/save-text.ts'
import { useUnits } from '../../lib/units.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { dayText } from '../../lib/dates.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Empty } from '../../ui/loaded.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { commonWords } from '../../words/common-words.ts'
import { stateWords } from '../../words/state-words.ts'
import { versionWords } from '../../words/version-words.ts'
import { measureText } from './measure-text.ts'

const order: readonly Status[] = ['crashed', 'fail', 'warn', 'unchecked', 'waived', 'info', 'pass']

/** Every verdict, the grave ones first; which kinds are shown is in the address. */
export function RulesTable({
  set,
  verdicts,
  onAccept,
}: {
  readonly set: string
  readonly verdicts: readonly Verdict[]
  readonly onAccept: ((verdict: Verdict) => void) | null
}): JSX.Element {
  const units = useUnits()
  const { value, choose } = useAddressFilter()
  const wanted = order.find((status) => status === value('verdicts'))
  const isAll = value('verdicts') === 'all'
  const rows = verdicts
    .filter(({ status }) => isAll || (wanted === undefined ? status !== 'pass' : status === wanted))
    .toSorted((a, b) => order.indexOf(a.status) - order.indexOf(b.status))
  const save = (): void =>
    saveText(
      `${set}-verdicts.csv`,
      csvText(
        ['status', 'rule', 'subject', 'actual', 'limit', 'unit', 'message', 'line'],
        rows.map(({ status, rule, subject, measure, message, at }) => [
          status,
          rule,
          subject,
          measure?.actual ?? null,
          measure?.limit ?? null,
          measure?.unit ?? null,
          message,
          at.line,
        ]),
      ),
    )
  return (
    <>
      <div className="mb-3 flex flex-wrap items-center gap-3">
        <label className="flex items-center gap-2 text-sm font-semibold">
          {versionWords.rulesShow}
          <select
            className="field w-auto"
            value={isAll ? 'all' : (wanted ?? '')}
            onChange={({ target }) => choose({ verdicts: target.value })}
          >
            <option value="">
              {versionWords.rulesNotable} ({verdicts.filter(({ status }) => status !== 'pass').length})
            </option>
            <option value="all">
              {versionWords.rulesAll} ({verdicts.length})
            </option>
            {order.map((status) => {
              const count = verdicts.filter((verdict) => verdict.status === status).length
              return count === 0 && status !== wanted ? null : (
                <option key={status} value={status}>
                  {stateWords[status]} ({count})
                </option>
              )
            })}
          </select>
        </label>
        <button type="button" className="button" onClick={save}>
          {commonWords.csv}
        </button>
      </div>
      {rows.length === 0 ? (
        <Empty title={isAll || wanted !== undefined ? versionWords.noRules : versionWords.allPass} />
      ) : (
        <DataTable
          caption={versionWords.rules}
          rows={rows}
          keyOf={(row) => row.fingerprint}
          columns={[
            { name: versionWords.verdict, cell: (row) => <StateMark state={row.status} /> },
            {
              name: versionWords.rule,
              isHead: true,
              cell: (row) => (
                <>
                  <span className="figure">{row.rule}</span>
                  <div className="font-normal text-soft">{row.subject}</div>
                </>
              ),
            },
            { name: versionWords.measured, isFigure: true, cell: (row) => measureText(row.measure, units).actual },
            {
              name: versionWords.limit,
              isFigure: true,
              isExtra: true,
              cell: (row) => measureText(row.measure, units).limit,
            },
            {
              name: versionWords.says,
              cell: (row) => (
                <>
                  {row.message}
                  {row.waiver === null ? null : (
                    <div className="text-waived">
                      {versionWords.waiver(row.waiver.reason, dayText(row.waiver.until))}
                    </div>
                  )}
                  <div className="flex flex-wrap items-center gap-3">
                    <a className="label" href={`#line-${String(row.at.line)}`}>
                      {versionWords.line(row.at.line)}
                    </a>
                    {onAccept !== null && row.status === 'fail' ? (
                      <button type="button" className="button" data-size="small" onClick={() => onAccept(row)}>
                        {versionWords.accept}
                      </button>
                    ) : null}
                  </div>
                </>
              ),
            },
          ]}
        />
      )}
    </>
  )
}
