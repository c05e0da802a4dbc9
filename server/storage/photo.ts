import sharp from 'sharp'
import { Refusal } from '../http/refusal.ts'

/** A photograph ready to be kept: upright, without metadata, in two sizes. */
export interface Photo {
  readonly full: Buffer
  readonly thumbnail: Buffer
  readonly width: number
  readonly height: number
}

const formats = new Set(['jpeg', 'png', 'webp', 'avif', 'heif'])
const longestEdge = 2_400
const thumbnailEdge = 480
/** More would take memory out of proportion to any photograph. */
const mostPixels = 80_000_000

sharp.cache(false)
sharp.concurrency(1)

const unreadable = (): Refusal =>
  new Refusal(
    415,
    'no-photo',
    'This is not a photograph that can be read here.',
    'Send JPEG, PNG, WebP or AVIF; phones have a setting such as “most compatible”.',
  )

/**
 * Reads a photograph by its content whatever it is called, turns it upright and leaves its metadata (place, device,
 * time, embedded previews) behind.
 */
export async function readPhoto(bytes: Buffer): Promise<Photo> {
  try {
    const options = { limitInputPixels: mostPixels, failOn: 'error' as const }
    const { format } = await sharp(bytes, options).metadata()
    if (!formats.has(format)) throw unreadable()
    const upright = sharp(bytes, options).rotate().flatten({ background: '#ffffff' })
    const resized = (edge: number) =>
      upright
        .clone()
        .resize({ width: edge, height: edge, fit: 'inside', withoutEnlargement: true })
        .toColourspace('srgb')
    const { data, info } = await resized(longestEdge).jpeg({ quality: 84 }).toBuffer({ resolveWithObject: true })
    const thumbnail = await resized(thumbnailEdge).jpeg({ quality: 78 }).toBuffer()
    return { full: data, thumbnail, width: info.width, height: info.height }
  } catch (error) {
    if (error instanceof Refusal) throw error
    throw unreadable()
  }
}
