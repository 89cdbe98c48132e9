import { ownFonts } from '#cli/fonts.ts'
import { verifiedJson, verifiedText } from '#cli/formats/verified.ts'
import { colourOf, endWith, print, readBytes, readText, say, terminalWidth } from '#cli/io.ts'
import { shelfFor } from '#cli/shelf.ts'
import { check, type Shelf } from '#core/engine.ts'
import { factsText } from '#core/report/facts.ts'
import { createdFrom, renderReport } from '#core/report/render.ts'
import { verdictsOf } from '#core/report/verdict-list.ts'
import { certificatesFrom } from '#core/seal/pem.ts'
import { verifyReport, type Workshop } from '#core/verify/verify-report.ts'

interface VerifyOptions {
  readonly proof?: string
  readonly trust?: readonly string[]
  readonly format: string
  readonly rulebook?: string
}

function stop(message: string): void {
  say(`${message}\n`)
  endWith(2)
}

type Read<Value> = { readonly ok: true; readonly value: Value } | { readonly ok: false; readonly message: string }

/** The certificates of all files that were named as trusted; none named is something else than none trusted. */
function trusted(files: readonly string[] | undefined): Read<readonly Uint8Array[] | undefined> {
  if (!files) return { ok: true, value: undefined }
  const certificates: Uint8Array[] = []
  for (const file of files) {
    const read = readText(file)
    if (!read.ok) return read
    const found = certificatesFrom(read.text)
    if (found.length === 0)
      return {
        ok: false,
        message: `${file} holds no certificate: name a PEM file, which begins with “-----BEGIN CERTIFICATE-----”.`,
      }
    certificates.push(...found)
  }
  return { ok: true, value: certificates }
}

function proofText(file: string | undefined): Read<string | undefined> {
  if (file === undefined) return { ok: true, value: undefined }
  const read = readText(file)
  return read.ok ? { ok: true, value: read.text } : read
}

/** The engine and the press, as this version has them. */
function workshop(shelf: Shelf): Workshop {
  return {
    judge: (text) => check(text, shelf),
    facts: factsText,
    verdicts: ({ findings }) => verdictsOf(findings),
    render: (judged, { text, file, issue }) =>
      renderReport(judged, {
        text,
        file,
        issue,
        fonts: ownFonts(),
        created: createdFrom(judged.install),
        draft: false,
      }),
  }
}

const isPdf = (bytes: Uint8Array): boolean => String.fromCharCode(...bytes.subarray(0, 5)) === '%PDF-'

/** Verifies an issued report, with no server and no network. */
export async function verify(file: string, { proof, trust, format, rulebook }: VerifyOptions): Promise<void> {
  const pdf = readBytes(file)
  if (!pdf.ok) return stop(pdf.message)
  if (!isPdf(pdf.bytes)) return stop(`${file} is no PDF.`)
  const [handed, roots, shelf] = [proofText(proof), trusted(trust), await shelfFor(rulebook)]
  if (!handed.ok) return stop(handed.message)
  if (!roots.ok) return stop(roots.message)
  if (!shelf.ok) return stop(shelf.message)
  const verdict = await verifyReport({
    pdf: pdf.bytes,
    proof: handed.value,
    trust: { certificates: roots.value, subtle: crypto.subtle },
    workshop: workshop(shelf.shelf),
  })
  const told =
    format === 'json'
      ? verifiedJson(file, verdict)
      : verifiedText(file, verdict, { colour: colourOf('stdout'), width: terminalWidth() })
  print(told)
  endWith(verdict.checks.every(({ holds }) => holds) ? 0 : 1)
}
