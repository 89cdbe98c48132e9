import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { expect, test } from 'vitest'
import { typeset } from '#core/paper/paper.ts'
import { sampleHtml, sampleOptions } from './sample.ts'
import { withFile } from './tools.ts'

/** Debian's libpdfbox2-java, libactivation-java and libjaxb-api-java put these here. */
const JARS = [
  'preflight',
  'pdfbox2',
  'xmpbox',
  'fontbox2',
  'commons-logging',
  'commons-io',
  'javax.activation',
  'jaxb-api',
].map((name) => `/usr/share/java/${name}.jar`)

const judge = (pdf: Uint8Array): string =>
  withFile('page.pdf', pdf, (path) => {
    const { stdout, stderr } = spawnSync(
      'java',
      ['-cp', JARS.join(':'), 'org.apache.pdfbox.preflight.Validator_A1b', path],
      { encoding: 'utf8' },
    )
    return stdout + stderr
  })

const absent = JARS.filter((jar) => !existsSync(jar))
const hasJava = spawnSync('java', ['-version']).status === 0

test('PDFBox Preflight accepts the sample as PDF/A-1b, and refuses the same page as PDF 1.7', (context) => {
  if (!hasJava || absent.length > 0) {
    context.skip(`no judge: ${hasJava ? absent.join(', ') : 'java'} is not installed`)
  }
  const flat = typeset(sampleHtml, { ...sampleOptions, attachments: [], flavour: 'PDF/A-1b' })
  expect(judge(flat)).toContain('is a valid PDF/A-1b file')
  expect(judge(typeset(sampleHtml, sampleOptions))).toContain('is not a valid PDF/A-1b file')
})
