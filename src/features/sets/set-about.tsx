import { useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Field } from '../../ui/field.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setWords } from '../../words/set-words.ts'
import { SamplePhoto } from './set-entry.tsx'
import { useChangeSet, usePinBaseline, usePutPhoto } from './set-mutations.ts'
import type { TemplateSet } from './set-queries.ts'

interface Given {
  readonly team: string
  readonly set: TemplateSet
  readonly canEdit: boolean
}

function Photo({ team, set, canEdit }: Given): JSX.Element {
  const put = usePutPhoto(team, set.name)
  return (
    <div className="max-w-72">
      <SamplePhoto photo={set.photo?.replace('size=thumbnail', 'size=full') ?? null} title={set.title} />
      {canEdit ? (
        <div className="mt-2">
          <label className="button relative has-focus-visible:outline-2" data-size="small">
            {put.isPending ? commonWords.sending : setWords.photoChoose}
            <input
              type="file"
              accept="image/jpeg,image/png,image/webp,image/heic,image/avif"
              className="absolute inset-0 size-full cursor-pointer opacity-0"
              onChange={({ target }) => {
                const file = target.files?.[0]
                if (file !== undefined) put.mutate(file)
                target.value = ''
              }}
            />
          </label>
          <p className="mt-1 text-sm text-soft">{setWords.photoHint}</p>
          <RefusalNote error={put.error} />
        </div>
      ) : null}
    </div>
  )
}

function Tags({ team, set, canEdit }: Given): JSX.Element {
  const change = useChangeSet(team, set.name)
  const [text, setText] = useState(set.tags.join(', '))
  if (!canEdit) return <p>{set.tags.length === 0 ? '–' : set.tags.join(', ')}</p>
  const tags = [
    ...new Set(
      text
        .split(',')
        .map((tag) => tag.trim())
        .filter((tag) => tag !== ''),
    ),
  ]
  return (
    <form
      className="space-y-2"
      onSubmit={(event) => {
        event.preventDefault()
        change.mutate({ tags })
      }}
    >
      <Field label={setWords.tags} hint={setWords.tagsHint}>
        {(parts) => (
          <input {...parts} className="field" value={text} onChange={({ target }) => setText(target.value)} />
        )}
      </Field>
      <RefusalNote error={change.error} />
      <div className="flex items-center gap-3">
        <button
          type="submit"
          className="button"
          data-size="small"
          disabled={change.isPending || tags.join() === set.tags.join()}
        >
          {setWords.saveTags}
        </button>
        <span role="status" className="text-sm">
          {change.isSuccess ? commonWords.saved : ''}
        </span>
      </div>
    </form>
  )
}

function PublicPage({ team, set, canEdit }: Given): JSX.Element {
  const change = useChangeSet(team, set.name)
  return (
    <div>
      <p className="text-sm font-semibold">{setWords.publicSwitch}</p>
      <p className="text-sm">{set.isPublic ? setWords.publicOn : setWords.publicOff}</p>
      <div className="mt-1 flex flex-wrap items-center gap-3">
        {canEdit ? (
          <button
            type="button"
            className="button"
            data-size="small"
            disabled={change.isPending}
            onClick={() => change.mutate({ isPublic: !set.isPublic })}
          >
            {set.isPublic ? setWords.switchOff : setWords.switchOn}
          </button>
        ) : null}
        {set.publicPage === null ? null : <Link to={set.publicPage}>{setWords.openPublic}</Link>}
      </div>
      <RefusalNote error={change.error} />
    </div>
  )
}

function Baseline({ team, set, canEdit }: Given): JSX.Element {
  const pin = usePinBaseline(team, set.name)
  return (
    <div>
      <p className="text-sm font-semibold">{setWords.baseline}</p>
      <p className="text-sm">
        {set.pinned === null
          ? setWords.notPinned
          : `${setWords.pinned(set.pinned.number, set.pinned.by)}: ${set.pinned.note}`}
      </p>
      {set.pinned !== null && canEdit ? (
        <button
          type="button"
          className="button mt-1"
          data-size="small"
          disabled={pin.isPending}
          onClick={() => pin.mutate(null)}
        >
          {setWords.unpin}
        </button>
      ) : null}
      <RefusalNote error={pin.error} />
    </div>
  )
}

/** What is said of a set besides its versions. */
export function SetAbout(given: Given): JSX.Element {
  return (
    <div className="grid gap-6 sm:grid-cols-2">
      <Photo {...given} />
      <div className="space-y-5">
        <Tags {...given} />
        <Baseline {...given} />
        <PublicPage {...given} />
      </div>
    </div>
  )
}
