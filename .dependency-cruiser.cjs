/** Arrows of the house. Each rule says why it is there. */
module.exports = {
  forbidden: [
    {
      name: 'core-stands-alone',
      comment:
        'core is shared by command line, server and browser: it may lean on nothing of ours but itself and the data of schemas/.',
      severity: 'error',
      from: { path: '^core/' },
      to: { path: '^(cli|server|src|tools|tests|templates|migrations|seeds)/' },
    },
    {
      name: 'core-is-pure',
      comment: 'core runs in a browser too: no files, no network, no process.',
      severity: 'error',
      from: { path: '^core/' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'cli-leans-on-core-only',
      comment: 'The command line works with no server.',
      severity: 'error',
      from: { path: '^cli/' },
      to: { path: '^(server|src|tools|tests|migrations|seeds)/' },
    },
    {
      name: 'server-leans-on-core-only',
      comment: 'What server and command line share lives in core.',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^(cli|src|tests|migrations|seeds)/' },
    },
    {
      name: 'routes-command-commands-query',
      comment: 'A query knows no command and no route, a command no route: each can be read and tested from below.',
      severity: 'error',
      from: { path: '^server/(queries|commands)/' },
      to: { path: '^server/routes/' },
    },
    {
      name: 'files-and-streams-in-one-place',
      comment:
        'Only cli/io.ts and what starts or runs beside it touch the machine, so that commands can be tested as functions.',
      severity: 'error',
      from: { path: '^cli/', pathNot: '^cli/(io|spool|watching|threads|launch)\\.ts$' },
      to: { dependencyTypes: ['core'], pathNot: '^(node:)?(path|url)$' },
    },
    {
      name: 'nothing-leans-on-tests',
      comment: 'Tests look at the house from outside.',
      severity: 'error',
      from: { pathNot: '^tests/' },
      to: { path: '^tests/' },
    },
    {
      name: 'no-circles',
      comment: 'Two files that need each other are one idea in two places.',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'no-development-tools-in-the-product',
      comment: 'What ships must install without the development dependencies.',
      severity: 'error',
      from: { path: '^(core|cli|server)/', pathNot: '\\.d\\.ts$' },
      to: { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'only-known-licences',
      comment: 'Only licences that allow handing the program on.',
      severity: 'error',
      from: { path: '^(core|cli|server)/' },
      to: {
        dependencyTypes: ['npm'],
        licenseNot:
          '^\\(?(MIT|MIT-0|ISC|BSD-2-Clause|BSD-3-Clause|Apache-2\\.0|0BSD|BlueOak-1\\.0\\.0|MIT AND OFL-1\\.1|MIT AND Zlib|MIT AND SIL.*)\\)?$',
      },
    },
    {
      name: 'everything-resolves',
      comment: 'An import that points nowhere fails at run time.',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|coverage)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.js', '.json', '.d.ts'],
    },
  },
}
