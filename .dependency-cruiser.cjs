/** Which way the arrows run: app → components → lib/calculators → lib/trade; app → lib/data → models. */
const pure = '^lib/(trade|calculators|drawing|exercises|pieces)/'
const framework = '^(react|react-dom|next|sequelize|mariadb|next-auth)(/|$)'

module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'trade-imports-nothing-of-ours',
      severity: 'error',
      from: { path: '^lib/trade/' },
      to: { path: '^(app|components|content|lib|models|migrations|scripts)/', pathNot: '^lib/trade/' },
    },
    {
      name: 'drawing-imports-trade-only',
      severity: 'error',
      from: { path: '^lib/drawing/' },
      to: { path: '^(app|components|lib|models)/', pathNot: '^lib/(trade|drawing)/' },
    },
    {
      name: 'calculators-import-trade-only',
      severity: 'error',
      from: { path: '^lib/calculators/' },
      to: { path: '^(app|components|lib|models)/', pathNot: '^lib/(trade|calculators)/' },
    },
    {
      name: 'pure-rooms-know-no-framework',
      severity: 'error',
      from: { path: pure },
      to: { path: `^node_modules/${framework.slice(1)}` },
    },
    {
      name: 'components-never-reach-the-database',
      severity: 'error',
      from: { path: '^components/' },
      to: { path: '^(models|migrations|app|lib/(data|http|auth|mail))(/|$)' },
    },
    {
      name: 'models-behind-data',
      severity: 'error',
      from: { path: '^(app|components|lib)/', pathNot: '^lib/data/' },
      to: { path: '^(models|migrations)/' },
    },
    {
      name: 'lib-never-imports-screens',
      severity: 'error',
      from: { path: '^lib/' },
      to: { path: '^(app|components)/' },
    },
    {
      name: 'screens-never-import-tests-or-scripts',
      severity: 'error',
      from: { path: '^(app|components|lib|models)/' },
      to: { path: '^(tests|scripts)/' },
    },
    {
      name: 'no-dev-dependency-in-the-product',
      severity: 'error',
      from: { path: '^(app|components|lib|models|migrations)/' },
      to: { dependencyTypes: ['npm-dev'], pathNot: 'node_modules/@types/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
}
