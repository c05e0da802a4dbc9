import { randomUUID } from 'node:crypto'
import type { Context } from '../context.ts'
import { fileAnswer, type FileAnswer } from '../http/answers.ts'
import { found } from '../http/refusal.ts'
import { readPhoto, type Photo } from './photo.ts'

export interface KeptPhoto extends Photo {
  readonly key: string
}

/** Where the small form of a photograph lies. */
const smallKey = (key: string): string => `${key}-small`

/** Keeps both forms of a photograph under a new key. */
export async function keepPhoto(context: Context, teamId: string, bytes: Buffer): Promise<KeptPhoto> {
  const photo = await readPhoto(bytes)
  const key = `teams/${teamId}/photos/${randomUUID()}`
  await context.objects.put(key, 'image/jpeg', photo.full)
  await context.objects.put(smallKey(key), 'image/jpeg', photo.thumbnail)
  return { ...photo, key }
}

export async function photoAnswer(
  context: Context,
  key: string | null,
  size: 'full' | 'thumbnail',
  keep: FileAnswer['keep'] = 'private',
): Promise<FileAnswer> {
  const object = key === null ? null : await context.objects.get(size === 'full' ? key : smallKey(key))
  return fileAnswer('image/jpeg', found(object, 'There is no photograph.').body, null, keep)
}

export const removePhoto = (context: Context, key: string): Promise<void> =>
  context.objects.remove([key, smallKey(key)])
