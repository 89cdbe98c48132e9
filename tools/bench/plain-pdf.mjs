// The baseline on paper: plain PDFKit text of as many pages as the report has, in milliseconds, warm.
import { readFileSync } from 'node:fs'
import PDFDocument from 'pdfkit'

const [pages, rounds, font] = [Number(process.argv[2]), Number(process.argv[3]), process.argv[4]]
const face = readFileSync(font)

function plain() {
  return new Promise((resolve) => {
    const document = new PDFDocument({ autoFirstPage: false })
    document.on('data', () => undefined)
    document.on('end', resolve)
    document.registerFont('body', face)
    for (let page = 0; page < pages; page += 1) {
      document.addPage()
      document.font('body').fontSize(9).text('The loop of circuit K1 reads 0.55 Ω; 0.96 Ω is the most. '.repeat(70))
    }
    document.end()
  })
}

await plain()
const start = performance.now()
for (let round = 0; round < rounds; round += 1) await plain()
process.stdout.write(String((performance.now() - start) / rounds))
