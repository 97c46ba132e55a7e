/** What may import what. The house is described in docs/architecture.md. */
module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'anthropometry-stands-alone',
      severity: 'error',
      from: { path: '^libs/anthropometry/src', pathNot: '\\.spec\\.ts$' },
      to: { path: '^(libs/geometry|apps|seed-data)' },
    },
    {
      name: 'geometry-may-use-anthropometry-only',
      severity: 'error',
      from: { path: '^libs/geometry/src', pathNot: '\\.spec\\.ts$' },
      to: { path: '^(apps|seed-data)' },
    },
    {
      name: 'libs-are-pure',
      comment: 'No Node, no DOM, no clock: a library gets what it needs as an argument.',
      severity: 'error',
      from: { path: '^libs/[^/]+/src', pathNot: '\\.spec\\.ts$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'web-and-api-do-not-meet',
      severity: 'error',
      from: { path: '^apps/(web|api)/' },
      to: { path: '^apps/(web|api)/', pathNot: '^apps/$1/' },
    },
    {
      name: 'web-features-meet-in-a-route',
      severity: 'error',
      from: { path: '^apps/web/src/features/([^/]+)/' },
      to: { path: '^apps/web/src/features/([^/]+)/', pathNot: '^apps/web/src/features/$1/' },
    },
    {
      name: 'shared-web-code-knows-no-feature',
      severity: 'error',
      from: { path: '^apps/web/src/(components|lib)/' },
      to: { path: '^apps/web/src/(features|routes|app)/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)dist/' },
    tsPreCompilationDeps: 'specify',
    tsConfig: { fileName: 'tsconfig.depend.json' },
    enhancedResolveOptions: { conditionNames: ['source', 'import', 'require', 'node', 'default'] },
  },
};
