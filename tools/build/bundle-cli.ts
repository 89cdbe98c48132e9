import { spawnSync } from 'node:child_process'
import {
  chmodSync,
  copyFileSync,
  existsSync,
  mkdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs'
import { basename } from 'node:path'
import { type BuildOptions, build, type Plugin } from 'esbuild'
import schema from '#core/generated/install-schema.js'
import pages from '#core/generated/rule-pages.js'
import { copyFonts } from './fonts.ts'

const PROJECT = new URL('../../', import.meta.url).pathname
const DIST = `${PROJECT}dist`

const SPREAD = '...DEFAULT_PARSER_OPTIONS,'
/** The YAML parser builds its state by spreading two objects, so that no two of its states look alike to the engine. */
const PLAIN_STATE = "filename: '', maxDepth: 100,"

/** Swaps a spread in the YAML parser for plain properties, and stops the build when it is no longer there. */
const plainParserState: Plugin = {
  name: 'plain-parser-state',
  setup(setup) {
    setup.onLoad({ filter: /js-yaml[\\/]dist[\\/]js-yaml\.(mjs|cjs\.js)$/ }, ({ path }) => {
      const contents = readFileSync(path, 'utf8')
      if (!contents.includes(SPREAD))
        throw new Error('js-yaml no longer spreads its parser options: take the replacement out of the build.')
      return { contents: contents.replace(SPREAD, PLAIN_STATE), loader: 'js' }
    })
  },
}

const EAGER = "const childProcess = require('node:child_process');"
const ON_CALL = "const childProcess = { spawn: (...given) => require('node:child_process').spawn(...given) };"

/** The command parser loads what starts other programs, which Skerry never does, at every start. */
const childProcessOnCall: Plugin = {
  name: 'child-process-on-call',
  setup(setup) {
    setup.onLoad({ filter: /commander[\\/]lib[\\/]command\.js$/ }, ({ path }) => {
      const contents = readFileSync(path, 'utf8')
      if (!contents.includes(EAGER))
        throw new Error('commander no longer loads child_process as it did: take the replacement out of the build.')
      return { contents: contents.replace(EAGER, ON_CALL), loader: 'js' }
    })
  },
}

const SHARED = {
  bundle: true,
  platform: 'node',
  target: 'node20',
  format: 'cjs',
  minify: true,
  charset: 'ascii',
  legalComments: 'none',
  // A script that is run from its text has nobody to import for it: what stays outside is required.
  supported: { 'dynamic-import': false },
  // Packages as CommonJS stay functions of their own, which cost nothing until they are called.
  mainFields: ['main', 'module'],
  define: { 'import.meta.url': '"file:///skerry.js"' },
} as const satisfies BuildOptions

const PAPER = 'skerry-paper.cjs'

/** The launcher calls a whole bundle as one function, so it need not copy it to put a head before it. */
const AS_FUNCTION = {
  banner: { js: '(function (exports, require, module, __filename, __dirname) {' },
  footer: { js: '})' },
} as const satisfies BuildOptions

/** The typesetting engine stands beside the rest: it is half of the code, and serves two commands. */
async function bundlePaper(): Promise<void> {
  await build({
    ...SHARED,
    ...AS_FUNCTION,
    entryPoints: [`${PROJECT}core/paper/paper.ts`],
    outfile: `${DIST}/${PAPER}`,
    alias: { pdfkit: `${PROJECT}node_modules/pdfkit/js/pdfkit.browser.mjs` },
  })
}

const paperBeside: Plugin = {
  name: 'paper-beside',
  setup(setup) {
    setup.onResolve({ filter: /core\/paper\/paper\.ts$/ }, () => ({ path: `./${PAPER}`, external: true }))
  },
}

const VERIFY = 'skerry-verify.cjs'
/** What only verifying takes; the engine and the press are handed in. */
const VERIFYING = ['core/verify/verify-report.ts', 'core/seal/pem.ts'] as const

/** Seals and registers stand beside the rest: only one command looks at them. */
async function bundleVerify(): Promise<void> {
  const contents = VERIFYING.map((file) => `export * from './${file}'`).join('\n')
  await build({
    ...SHARED,
    stdin: { contents, resolveDir: PROJECT, loader: 'ts' },
    outfile: `${DIST}/${VERIFY}`,
  })
}

const verifyBeside: Plugin = {
  name: 'verify-beside',
  setup(setup) {
    setup.onResolve({ filter: /core\/(?:verify\/verify-report|seal\/pem)\.ts$/ }, () => ({
      path: `./${VERIFY}`,
      external: true,
    }))
  },
}

/** Packages that only files with faults and books of one's own call for stand beside the bundle, each in a file. */
const SELDOM = {
  yaml: 'skerry-yaml.cjs',
  'ajv/dist/2020.js': 'skerry-ajv.cjs',
} as const

async function bundleSeldom(): Promise<void> {
  for (const [entry, file] of Object.entries(SELDOM))
    await build({ ...SHARED, entryPoints: [entry], absWorkingDir: PROJECT, outfile: `${DIST}/${file}` })
}

const seldomBeside: Plugin = {
  name: 'seldom-beside',
  setup(setup) {
    setup.onResolve({ filter: /^(?:yaml|ajv\/dist\/2020\.js)$/ }, ({ path }) => ({
      path: `./${SELDOM[path as keyof typeof SELDOM]}`,
      external: true,
    }))
  },
}

/** Large texts that most runs never look at stand beside the bundle as files. */
const TEXTS = {
  'rule-pages.js': { file: 'rule-pages.json', text: () => JSON.stringify(pages()), read: 'JSON.parse(TEXT)' },
  'install-schema.js': { file: 'install.schema.json', text: () => schema(), read: 'TEXT' },
} as const

const textsBeside: Plugin = {
  name: 'texts-beside',
  setup(setup) {
    setup.onLoad({ filter: /core[\\/]generated[\\/](rule-pages|install-schema)\.js$/ }, ({ path }) => {
      const { file, text, read } = TEXTS[basename(path) as keyof typeof TEXTS]
      writeFileSync(`${DIST}/${file}`, text())
      const call = `require('node:fs').readFileSync(__dirname + '/${file}', 'utf8')`
      return { contents: `export default () => ${read.replace('TEXT', call)}`, loader: 'js' }
    })
  },
}

async function bundle(): Promise<void> {
  await build({
    ...SHARED,
    ...AS_FUNCTION,
    entryPoints: [`${PROJECT}cli/launch.ts`],
    outfile: `${DIST}/skerry-main.cjs`,
    plugins: [plainParserState, childProcessOnCall, paperBeside, verifyBeside, seldomBeside, textsBeside],
  })
}

const EXAMPLE = `${PROJECT}examples/alder-mill-bakery.skerry.yaml`
/** What is run so that what V8 compiles for it is what the cache of a bundle holds. */
const WARM_RUNS = {
  'skerry-main': ['check', EXAMPLE],
  'skerry-paper': ['render', EXAMPLE, '-o', `${DIST}/warm.pdf`],
} as const

function warmCaches(): void {
  for (const [name, words] of Object.entries(WARM_RUNS)) {
    const run = spawnSync(process.execPath, [`${DIST}/skerry.cjs`, ...words], {
      env: { ...process.env, SKERRY_MAKE_CACHE: name },
      encoding: 'utf8',
    })
    if (run.status !== 0 && run.status !== 1) throw new Error(`The bundle does not run:\n${run.stderr}`)
    if (!existsSync(`${DIST}/${name}.cache`)) throw new Error(`No compiled code was kept of ${name}.`)
  }
  rmSync(`${DIST}/warm.pdf`, { force: true })
}

/** npx looks for commands here. */
function link(): void {
  const command = `${PROJECT}node_modules/.bin/skerry`
  if (existsSync(command)) return
  rmSync(command, { force: true })
  symlinkSync('../../dist/skerry.cjs', command)
}

mkdirSync(DIST, { recursive: true })
for (const name of Object.keys(WARM_RUNS)) rmSync(`${DIST}/${name}.cache`, { force: true })
await bundlePaper()
await bundleVerify()
await bundleSeldom()
await bundle()
copyFileSync(`${PROJECT}tools/build/launcher.cjs`, `${DIST}/skerry.cjs`)
copyFileSync(`${PROJECT}schemas/install.draft-07.schema.json`, `${DIST}/install.draft-07.schema.json`)
chmodSync(`${DIST}/skerry.cjs`, 0o755)
copyFonts(`${DIST}/fonts`)
warmCaches()
link()
