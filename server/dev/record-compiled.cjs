// Required before the bundle: at its end, lays what Node compiled of each script beside it.
const { writeFileSync } = require('node:fs')
const vm = require('node:vm')

const scripts = []
vm.Script = class extends vm.Script {
  constructor(code, options) {
    super(code, options)
    scripts.push([options.filename, this])
  }
}
process.on('exit', () => {
  for (const [file, script] of scripts) writeFileSync(`${file}.compiled`, script.createCachedData())
})
