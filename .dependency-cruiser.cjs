// Which room may import which: the table in docs/architecture.md, held by `npm run lint`.
const rooms = {
  core: [],
  weather: ['core'],
  tariffs: ['core'],
  sim: ['core', 'weather'],
  compare: ['core', 'sim', 'tariffs'],
  scenario: ['core', 'weather', 'tariffs', 'sim', 'compare'],
  batch: ['core', 'weather', 'tariffs', 'sim', 'compare', 'scenario'],
  report: ['core', 'weather', 'tariffs', 'sim', 'compare', 'scenario', 'batch'],
};

const roomRules = Object.entries(rooms).map(([room, allowed]) => ({
  name: `src-${room}-imports`,
  severity: 'error',
  comment: `src/${room} may import ${allowed.length ? allowed.join(', ') : 'no other room'}`,
  from: { path: `^src/${room}/` },
  to: { path: '^src/', pathNot: `^src/(${[room, ...allowed].join('|')})/` },
}));

module.exports = {
  forbidden: [
    ...roomRules,
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'src-is-pure', severity: 'error', from: { path: '^src/' }, to: { dependencyTypes: ['core'] } },
    { name: 'src-knows-no-edge', severity: 'error', from: { path: '^src/' }, to: { path: '^(cli|web|tests|bench)/' } },
    { name: 'web-knows-src-alone', severity: 'error', from: { path: '^web/' }, to: { path: '^(cli|tests|bench)/' } },
    { name: 'cli-knows-no-page', severity: 'error', from: { path: '^cli/' }, to: { path: '^web/' } },
    {
      name: 'no-dev-in-product',
      severity: 'error',
      from: { path: '^(src|cli)/' },
      to: { dependencyTypes: ['npm-dev'] },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      extensions: ['.ts', '.tsx', '.js', '.mjs'],
      conditionNames: ['import', 'types', 'default'],
    },
  },
};
