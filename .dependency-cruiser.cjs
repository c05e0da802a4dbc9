/** Which folder may import which: the shells import shared, never one another; shared imports nothing outside itself. */
module.exports = {
  forbidden: [
    // Types may look at one another, and a registry may be looked at by what it loads later.
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only', 'dynamic-import'] } },
    },
    { name: 'shared-stands-alone', severity: 'error', from: { path: '^shared' }, to: { path: '^(cli|server|src)/' } },
    { name: 'shared-has-no-io', severity: 'error', from: { path: '^shared' }, to: { dependencyTypes: ['core'] } },
    { name: 'cli-not-sideways', severity: 'error', from: { path: '^cli' }, to: { path: '^(server|src)/' } },
    { name: 'server-not-sideways', severity: 'error', from: { path: '^server' }, to: { path: '^(cli|src)/' } },
    { name: 'page-not-sideways', severity: 'error', from: { path: '^src' }, to: { path: '^(cli|server)/' } },
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    doNotFollow: { path: 'node_modules' },
  },
}
