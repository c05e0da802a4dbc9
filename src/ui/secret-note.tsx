import { useState, type JSX } from 'react'
import { commonWords } from '../words/common-words.ts'

/** A secret that is shown this once. */
export function SecretNote({
  title,
  explain,
  secret,
}: {
  readonly title: string
  readonly explain: string
  readonly secret: string
}): JSX.Element {
  const [isCopied, setIsCopied] = useState(false)
  return (
    <div role="status" className="mb-4 border-2 border-ink bg-info-wash p-4">
      <p className="font-semibold">{title}</p>
      <p className="text-sm">{explain}</p>
      <p className="mt-2 flex flex-wrap items-center gap-3">
        <code className="figure border border-stroke bg-sheet px-2 py-1 text-sm break-all select-all">{secret}</code>
        <button
          type="button"
          className="button"
          data-size="small"
          onClick={() => void navigator.clipboard.writeText(secret).then(() => setIsCopied(true))}
        >
          {isCopied ? commonWords.copied : commonWords.copy}
        </button>
      </p>
    </div>
  )
}
