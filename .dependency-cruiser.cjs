/** Which folder may import which: the shells import shared, never one another; shared imports nothing outside itself. */
module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true, dependencyTypesNot: ['type-only'] } },
    { name: 'shared-stands-alone', severity: 'error', from: { path: '^shared' }, to: { path: '^(cli|server|src)/' } },
    { name: 'shared-has-no-io', severity: 'error', from: { path: '^shared' }, to: { dependencyTypes: ['core'] } },
    { name: 'cli-not-sideways', severity: 'error', from: { path: '^cli' }, to: { path: '^(server|src)/' } },
    { name: 'server-not-sideways', severity: 'error', from: { path: '^server' }, to: { path: '^(cli|src)/' } },
    { name: 'page-not-sideways', severity: 'error', from: { path: '^src' }, to: { path: '^(cli|server)/' } },
  ],
  options: { tsPreCompilationDeps: true, tsConfig: { fileName: 'tsconfig.json' }, doNotFollow: { path: 'node_modules' } },
}
