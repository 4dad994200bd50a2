/** Who may import whom. Type imports count as imports. ARCHITECTURE in DEVELOPERS.md says it in words. */
const PURE = '^lib/(?!server/)'

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true, pathNot: '^db/schema/' } },
    {
      name: 'spacing-stands-alone',
      comment: 'The rule engine knows plant types and lengths, nothing else.',
      severity: 'error',
      from: { path: '^lib/spacing/' },
      to: { pathNot: ['^lib/spacing/', '^lib/plants/types\\.ts$', '^lib/measure/'] },
    },
    {
      name: 'spacing-has-one-door',
      severity: 'error',
      from: { pathNot: ['^lib/spacing/', '^tests/'] },
      to: { path: '^lib/spacing/(?!index\\.ts$)' },
    },
    {
      name: 'pure-lib-imports-pure-lib',
      comment: 'Pure code reaches for no database, server, React, Konva or Node.',
      severity: 'error',
      from: { path: PURE },
      to: { path: ['^lib/server/', '^db/', '^app/', '^components/', '^seed/', '^scripts/', 'node_modules/(react|react-dom|konva|react-konva|next|drizzle-orm|better-sqlite3)/'] },
    },
    { name: 'pure-lib-has-no-node', severity: 'error', from: { path: PURE }, to: { dependencyTypes: ['core'] } },
    {
      name: 'lib-folders-by-their-index',
      severity: 'error',
      from: { path: '^lib/([^/]+)/', pathNot: '^lib/(server|spacing)/' },
      to: { path: '^lib/[^/]+/', pathNot: ['^lib/$1/', '^lib/[^/]+/index\\.ts$', '^lib/plants/(types|schema)\\.ts$'] },
    },
    { name: 'server-imports-lib-and-db', severity: 'error', from: { path: '^lib/server/' }, to: { path: '^(app|components|seed|scripts|tests)/' } },
    { name: 'components-are-given-data', severity: 'error', from: { path: '^components/' }, to: { path: '^(app|db|lib/server|seed|scripts|tests)/' } },
    { name: 'app-leaves-db-to-operations', severity: 'error', from: { path: '^app/' }, to: { path: '^(db|seed|scripts|tests)/' } },
    { name: 'db-knows-pure-lib-only', severity: 'error', from: { path: '^db/' }, to: { path: '^(app|components|lib/server|seed|scripts|tests)/' } },
    {
      name: 'konva-stays-in-the-canvas',
      severity: 'error',
      from: { pathNot: '^components/drawing-table/canvas/' },
      to: { path: 'node_modules/(konva|react-konva)/' },
    },
    {
      name: 'editor-has-no-react',
      comment: 'The editor runs without DOM, React or Konva: tests script it.',
      severity: 'error',
      from: { path: '^components/drawing-table/editor/' },
      to: { path: 'node_modules/(react|react-dom|konva|react-konva|next)/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    exclude: { path: '^(\\.next|\\.data|test-results)' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'require', 'node', 'default', 'types'] },
  },
}
