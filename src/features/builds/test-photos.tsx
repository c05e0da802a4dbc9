import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { limits } from '../../../shared/api/limits.ts'
import { call, sendFile } from '../../lib/api.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { buildWords } from '../../words/build-words.ts'
import { buildFormQuery } from './build-queries.ts'
import type { FormAnswer } from './draft.ts'

type Photo = NonNullable<FormAnswer['build']>['photos'][number]

/** Photographs of a build; a draft is kept before the first one is sent. */
export function TestPhotos({
  linkKey,
  photos,
  onBefore,
}: {
  readonly linkKey: string
  readonly photos: readonly Photo[]
  readonly onBefore: () => Promise<unknown>
}): JSX.Element {
  const client = useQueryClient()
  const [alt, setAlt] = useState('')
  const [mayBePublished, setMayBePublished] = useState(false)
  const refresh = (): Promise<unknown> => client.invalidateQueries({ queryKey: buildFormQuery(linkKey).queryKey })
  const add = useMutation({
    mutationFn: async (file: File) => {
      await onBefore()
      return sendFile(
        buildEndpoints.addBuildPhoto,
        { params: { key: linkKey }, query: { alt, mayBePublished: mayBePublished ? 'true' : 'false' } },
        file,
      )
    },
    onSuccess: async () => {
      setAlt('')
      await refresh()
    },
  })
  const remove = useMutation({
    mutationFn: (photo: string) => call(buildEndpoints.removeBuildPhoto, { params: { key: linkKey, photo } }),
    onSuccess: refresh,
  })
  return (
    <div className="space-y-3">
      <p className="text-sm text-soft">{buildWords.photosHint}</p>
      <ul className="grid grid-cols-2 gap-3 sm:grid-cols-3">
        {photos.map((photo) => (
          <li key={photo.id}>
            <img
              src={photo.thumbnail}
              alt={photo.alt === '' ? buildWords.photoFallback : photo.alt}
              className="w-full border border-hair"
            />
            <button type="button" className="button mt-1" data-size="small" onClick={() => remove.mutate(photo.id)}>
              {commonWords.remove}
            </button>
          </li>
        ))}
      </ul>
      {photos.length >= limits.photosPerBuild ? null : (
        <>
          <Field label={buildWords.photoAlt}>
            {(parts) => (
              <input
                {...parts}
                maxLength={limits.title}
                className="field"
                value={alt}
                onChange={({ target }) => setAlt(target.value)}
              />
            )}
          </Field>
          <label className="flex items-center gap-2">
            <input
              type="checkbox"
              checked={mayBePublished}
              onChange={({ target }) => setMayBePublished(target.checked)}
            />
            {buildWords.photoPublish}
          </label>
          <label className="button relative has-focus-visible:outline-2">
            {add.isPending ? commonWords.sending : buildWords.photoAdd}
            <input
              type="file"
              accept="image/*"
              className="absolute inset-0 size-full cursor-pointer opacity-0"
              disabled={add.isPending}
              onChange={({ target }) => {
                const file = target.files?.[0]
                if (file !== undefined) add.mutate(file)
                target.value = ''
              }}
            />
          </label>
        </>
      )}
      <RefusalNote error={add.error ?? remove.error} />
    </div>
  )
}
