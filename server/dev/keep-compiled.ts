import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { Plugin } from 'vite'

const here = (relative: string): string => fileURLToPath(new URL(relative, import.meta.url))

/** Loads the code beside it with what Node compiled of it before; another Node compiles it again. */
const loader = `"use strict";
const { readFileSync } = require("node:fs");
const { Script } = require("node:vm");
let cachedData;
try {
  cachedData = readFileSync(__filename + ".compiled");
} catch {}
const script = new Script(readFileSync(__filename + ".code", "latin1"), { filename: __filename, cachedData });
script.runInThisContext()(exports, require, module, __filename, __dirname);
`

/** Plain ASCII is read as it lies; what is beyond stands in literals only, where it may be escaped. */
const inAscii = (code: string): string =>
  code.replace(/[\u0080-\uffff]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`)

/**
 * Keeps what Node compiles of the chunk that judges sets: compiling it takes longer than judging. Once the bundle is
 * written, the demonstration sets are checked with it, and what that compiled is laid beside the chunk.
 */
export const keepCompiled = (chunkName: string): Plugin => ({
  name: 'keep-compiled',
  generateBundle(_, bundle) {
    // Node takes files by this, and the package around it holds modules of the other kind.
    this.emitFile({ type: 'asset', fileName: 'package.json', source: '{ "type": "commonjs" }\n' })
    for (const chunk of Object.values(bundle)) {
      if (chunk.type !== 'chunk' || chunk.name !== chunkName) continue
      const code = `(function (exports, require, module, __filename, __dirname) {${inAscii(chunk.code)}\n})`
      this.emitFile({ type: 'asset', fileName: `${chunk.fileName}.code`, source: code })
      chunk.code = loader
    }
  },
  writeBundle({ dir = '' }) {
    const { status, stderr } = spawnSync(
      process.execPath,
      ['--require', here('record-compiled.cjs'), join(dir, 'foldgauge.js'), 'check', '--report', 'json'],
      { cwd: here('../../shared/demo'), encoding: 'utf8' },
    )
    if (status !== 0) this.error(`the bundle cannot check the demonstration sets: ${stderr}`)
  },
})
