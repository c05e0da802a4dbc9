import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** True where a program is installed; tests that read our files through it run only then. */
export const hasTool = (name: string): boolean => spawnSync('which', [name]).status === 0

/** Runs something in a folder of its own that is gone afterwards. */
export function inFolder<T>(work: (folder: string) => T): T {
  const folder = mkdtempSync(join(tmpdir(), 'foldgauge-'))
  try {
    return work(folder)
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

/** A grey picture: one byte a pixel, rows from the top. */
export interface Raster {
  readonly width: number
  readonly height: number
  readonly isDark: (x: number, y: number) => boolean
  /** Bytes of a row, 0 where it is black: drawn without smoothing there is nothing between. */
  readonly row: (y: number) => Buffer
  /** Pixels in a millimetre. */
  readonly perMm: number
}

function readPgm(bytes: Buffer, dpi: number): Raster {
  const head = /^P5\s+(\d+)\s+(\d+)\s+(\d+)\s/.exec(bytes.subarray(0, 64).toString('latin1'))
  if (head === null) throw new Error('not a grey picture')
  const [width, height] = [Number(head[1]), Number(head[2])]
  const start = head[0].length
  const row = (y: number): Buffer => bytes.subarray(start + y * width, start + (y + 1) * width)
  return { width, height, perMm: dpi / 25.4, isDark: (x, y) => (bytes[start + y * width + x] ?? 255) < 128, row }
}

/** Pages of a PDF as pixels, drawn by poppler without smoothing. */
export function rasterPdf(pdf: Uint8Array, dpi: number, page: number): Raster {
  return inFolder((folder) => {
    writeFileSync(join(folder, 'in.pdf'), pdf)
    const words = [
      '-r',
      String(dpi),
      '-gray',
      '-aa',
      'no',
      '-aaVector',
      'no',
      '-f',
      String(page),
      '-l',
      String(page),
      '-singlefile',
    ]
    execFileSync('pdftoppm', [...words, join(folder, 'in.pdf'), join(folder, 'out')])
    return readPgm(readFileSync(join(folder, 'out.pgm')), dpi)
  })
}

/** Outermost dark pixels, in millimetres from the left and the top. */
export function darkBounds(raster: Raster): {
  readonly left: number
  readonly top: number
  readonly right: number
  readonly bottom: number
} {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity]
  for (let y = 0; y < raster.height; y += 1) {
    const row = raster.row(y)
    const first = row.indexOf(0)
    if (first < 0) continue
    left = Math.min(left, first)
    right = Math.max(right, row.lastIndexOf(0) + 1)
    top = Math.min(top, y)
    bottom = Math.max(bottom, y + 1)
  }
  return {
    left: left / raster.perMm,
    top: top / raster.perMm,
    right: right / raster.perMm,
    bottom: bottom / raster.perMm,
  }
}
