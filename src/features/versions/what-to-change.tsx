import { useQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import type { Report, Verdict } from '../../../shared/report/report.ts'
import { StateMark } from '../../ui/state-mark.tsx'
import { versionWords } from '../../words/version-words.ts'
import type { VersionText } from '../engine/engine-queries.ts'

/** Smallest changes that pass, worked out in this browser only where something fails. */
const fixesQuery = (version: VersionText, report: Report, isNeeded: boolean) => ({
  queryKey: ['fixes', version.digest, version.file],
  queryFn: async () => {
    const { judgeText } = await import('../engine/judge-text.ts')
    const judged = judgeText(version.text, version.workspace, {
      file: version.file,
      asOf: version.asOf,
      fixes: true,
      ...(report.paper === null ? {} : { paper: report.paper }),
      ...(report.scale === 1 ? {} : { scale: report.scale }),
      workmanship: report.workmanship,
    })
    return new Map(judged.verdicts.map(({ fingerprint, fix }) => [fingerprint, fix]))
  },
  staleTime: Infinity,
  enabled: isNeeded,
})

const worst = ({ status }: Verdict): boolean => status === 'fail' || status === 'crashed'

/** Each failure as a sentence, where it stands in the text, and the least that would mend it. */
export function WhatToChange({
  report,
  version,
}: {
  readonly report: Report
  readonly version: VersionText
}): JSX.Element | null {
  const failing = report.verdicts.filter(worst)
  const fixes = useQuery(
    fixesQuery(
      version,
      report,
      failing.some(({ fix }) => fix === null),
    ),
  )
  if (failing.length === 0) return null
  return (
    <ul className="space-y-4">
      {failing.map((verdict) => {
        const fix = verdict.fix ?? fixes.data?.get(verdict.fingerprint) ?? null
        return (
          <li key={verdict.fingerprint} className="border-l-4 border-fail pl-3">
            <StateMark state={verdict.status} />
            <p>{verdict.message}</p>
            {fix === null ? (
              <p className="text-sm text-soft">
                {fixes.isFetching ? versionWords.fixBusy : fixes.data === undefined ? '' : versionWords.fixNone}
              </p>
            ) : (
              <p className="mt-1 text-sm">
                <span className="font-semibold">{fix.note}</span>{' '}
                <span className="figure">
                  {fix.path.join('.')}: <del>{fix.from}</del> → <ins className="font-bold no-underline">{fix.to}</ins>
                </span>
              </p>
            )}
            <p className="label mt-0.5">
              <a href={`#line-${String(verdict.at.line)}`}>
                {verdict.at.file}, {versionWords.line(verdict.at.line)}
              </a>{' '}
              · {verdict.rule} · {verdict.subject}
            </p>
          </li>
        )
      })}
    </ul>
  )
}
