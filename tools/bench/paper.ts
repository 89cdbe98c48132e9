// Pages a second: the example's report, against plain PDFKit text of as many pages.
import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { check } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { renderReport } from '#core/report/render.ts'
import { readFonts } from '#tools/build/fonts.ts'

const FILE = 'examples/alder-mill-bakery.skerry.yaml'
const ROUNDS = 10

const fonts = readFonts()
const text = readFileSync(FILE, 'utf8')
const judged = check(text, { find: shippedBook, names: SHIPPED_BOOKS })
if (judged.kind !== 'judged') throw new Error(`${FILE} cannot be judged.`)

const render = () => renderReport(judged, { text, file: FILE, fonts, created: '2026-10-13T00:00:00Z', draft: true })

function plain(pages: number): number {
  const font = 'node_modules/@expo-google-fonts/ibm-plex-sans/400Regular/IBMPlexSans_400Regular.ttf'
  const { stdout } = spawnSync(process.execPath, ['tools/bench/plain-pdf.mjs', String(pages), String(ROUNDS), font], {
    encoding: 'utf8',
  })
  return Number(stdout)
}

const cold = performance.now()
const first = render()
const coldMilliseconds = performance.now() - cold
const pages = (new TextDecoder('latin1').decode(first).match(/\/Type \/Page\b(?!s)/g) ?? []).length
const cpu = process.cpuUsage()
const start = performance.now()
for (let round = 0; round < ROUNDS; round += 1) render()
const warm = (performance.now() - start) / ROUNDS
const used = process.cpuUsage(cpu)
const plainWarm = plain(pages)

process.stdout.write(`\nPaper: the report of ${FILE}, ${pages} pages, ${(first.length / 1024).toFixed(0)} kB
  first report in this process  ${coldMilliseconds.toFixed(0)} ms
  report, warm                  ${warm.toFixed(0)} ms  ${((pages * 1000) / warm).toFixed(0)} pages/s  (${((used.user + used.system) / 1000 / ROUNDS).toFixed(0)} ms of CPU)
  plain text, as many pages     ${plainWarm.toFixed(0)} ms  ${((pages * 1000) / plainWarm).toFixed(0)} pages/s
  ratio                         ${(warm / plainWarm).toFixed(2)} ×
  memory of this process        ${(process.memoryUsage.rss() / 1024 / 1024).toFixed(0)} MB
`)
