import type { JSX } from 'react'
import { saveText } from '../../lib/save-text.ts'
import { versionWords } from '../../words/version-words.ts'
import type { Version } from './version-queries.ts'

/** The texts and the report of a version as files. */
export function Downloads({ version }: { readonly version: Version }): JSX.Element {
  const name = `${version.set}-v${String(version.number)}`
  const { workspace } = version
  return (
    <>
      <div className="flex flex-wrap gap-2">
        <button type="button" className="button" onClick={() => saveText(`${name}.yaml`, version.text, 'text/yaml')}>
          {versionWords.downloadText}
        </button>
        {workspace === null ? null : (
          <button
            type="button"
            className="button"
            onClick={() => saveText('foldgauge.yaml', workspace.text, 'text/yaml')}
          >
            {versionWords.downloadWorkspace}
          </button>
        )}
        <button
          type="button"
          className="button"
          onClick={() => saveText(`${name}-report.json`, JSON.stringify(version.report, null, 2), 'application/json')}
        >
          {versionWords.downloadReport}
        </button>
      </div>
      <p className="mt-2 text-sm text-soft">{versionWords.downloadNote}</p>
    </>
  )
}
