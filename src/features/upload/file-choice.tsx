import { useState, type JSX } from 'react'
import { setsWords } from '../../words/sets-words.ts'
import { droppedFiles } from './dropped-files.ts'

function Choose({
  name,
  isFolder,
  onChoose,
}: {
  readonly name: string
  readonly isFolder: boolean
  readonly onChoose: (files: readonly File[]) => void
}): JSX.Element {
  return (
    <label className="button relative has-focus-visible:outline-2 has-focus-visible:outline-offset-2">
      {name}
      <input
        type="file"
        multiple
        {...(isFolder ? { webkitdirectory: '' } : { accept: '.yaml,.yml' })}
        className="absolute inset-0 size-full cursor-pointer opacity-0"
        onChange={({ target }) => {
          onChoose([...(target.files ?? [])])
          target.value = ''
        }}
      />
    </label>
  )
}

/** Files or a folder, chosen by button or dropped; dropping is a short cut, never the only way. */
export function FileChoice({ onChoose }: { readonly onChoose: (files: readonly File[]) => void }): JSX.Element {
  const [isOver, setIsOver] = useState(false)
  return (
    <div
      className={`border-2 border-dashed p-6 text-center ${isOver ? 'border-ink bg-shade' : 'border-stroke'}`}
      onDragOver={(event) => {
        event.preventDefault()
        setIsOver(true)
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={(event) => {
        event.preventDefault()
        setIsOver(false)
        void droppedFiles(event.dataTransfer.items).then(onChoose)
      }}
    >
      <p className="font-semibold">{setsWords.drop}</p>
      <p className="mx-auto mb-4 max-w-prose text-sm text-soft">{setsWords.uploadExplain}</p>
      <div className="flex flex-wrap justify-center gap-3">
        <Choose name={setsWords.chooseFolder} isFolder onChoose={onChoose} />
        <Choose name={setsWords.chooseFiles} isFolder={false} onChoose={onChoose} />
      </div>
    </div>
  )
}
