import { spawnSync } from 'node:child_process'
import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { pemOf } from '#core/seal/pem.ts'
import { flat, isDictionary, Objects, structureOf } from '../../paper/pdf-objects.ts'
import { run, withFile } from '../../paper/tools.ts'
import { person, root } from './people.ts'
import { latin1, patched, sealed } from './sealed.ts'

const stranger = person('Stranger', 'authority')
const hasStore = spawnSync('certutil', ['-H']).error === undefined

/** What poppler says of a PDF, with one certificate in its store. */
function pdfsig(pdf: Uint8Array, trusted: Uint8Array): string {
  return withFile('sealed.pdf', pdf, (path, folder) => {
    writeFileSync(join(folder, 'root.pem'), pemOf(trusted))
    run('certutil', '-N', '-d', `sql:${folder}`, '--empty-password')
    run('certutil', '-A', '-d', `sql:${folder}`, '-n', 'root', '-t', 'CT,CT,CT', '-i', join(folder, 'root.pem'))
    const { stdout } = spawnSync('pdfsig', ['-nssdir', folder, path], { encoding: 'utf8' })
    return stdout
  })
}

/** Takes the signature and what it covers out of a sealed PDF, and asks OpenSSL. */
function cms(pdf: Uint8Array, trusted: Uint8Array): { readonly code: number | null; readonly said: string } {
  const text = latin1(pdf)
  const [, first = '', second = ''] = /\/ByteRange \[0 (\d+) (\d+) \d+ *\]/.exec(text) ?? []
  const hex = text.slice(Number(first) + 1, Number(second) - 1)
  return withFile('signature.der', new Uint8Array(Buffer.from(hex, 'hex')), (path, folder) => {
    const covered = Buffer.concat([pdf.subarray(0, Number(first)), pdf.subarray(Number(second))])
    writeFileSync(join(folder, 'content'), covered)
    writeFileSync(join(folder, 'root.pem'), pemOf(trusted))
    const words = [
      'cms',
      '-verify',
      '-cades',
      '-binary',
      '-inform',
      'DER',
      '-in',
      path,
      '-content',
      join(folder, 'content'),
    ]
    const when = String(Date.parse('2026-10-21T09:30:05Z') / 1000)
    const { status, stderr } = spawnSync(
      'openssl',
      [...words, '-CAfile', join(folder, 'root.pem'), '-attime', when, '-out', '/dev/null'],
      { encoding: 'utf8' },
    )
    return { code: status, said: stderr }
  })
}

describe('other programs refuse', () => {
  const at = latin1(sealed).indexOf('%%EOF') - 30
  const changed = patched(sealed, at, [(sealed[at] ?? 0) ^ 1])

  it('poppler: a file that was changed, and a certificate of nobody that it knows', (context) => {
    if (!hasStore) context.skip('no judge: certutil (libnss3-tools) is not installed')
    expect(pdfsig(changed, root.certificates[0])).toContain('Signature Validation: Digest Mismatch.')
    expect(pdfsig(sealed, stranger.certificates[0])).not.toContain('Certificate is Trusted.')
  })

  it('OpenSSL: a file that was changed, and a certificate that leads elsewhere', () => {
    expect(cms(changed, root.certificates[0])).toMatchObject({
      code: 4,
      said: expect.stringContaining('verification failure'),
    })
    expect(cms(sealed, stranger.certificates[0]).code).toBe(4)
  })
})

describe('other programs accept', () => {
  it('poppler: the signature is valid, covers the total document, and is trusted', (context) => {
    if (!hasStore) context.skip('no judge: certutil (libnss3-tools) is not installed')
    const said = pdfsig(sealed, root.certificates[0])
    for (const part of [
      'Signer Certificate Common Name: Seal',
      'Signing Time: Oct 21 2026 09:30:05',
      'Signing Hash Algorithm: SHA-256',
      'Signature Type: ETSI.CAdES.detached',
      'Total document signed',
      'Signature Validation: Signature is Valid.',
      'Certificate Validation: Certificate is Trusted.',
    ])
      expect(said).toContain(part)
  })

  it('OpenSSL: the signature and its attributes, as CAdES', () => {
    expect(cms(sealed, root.certificates[0])).toMatchObject({
      code: 0,
      said: expect.stringContaining('CAdES Verification successful'),
    })
  })

  it('qpdf: the file is sound', () => {
    expect(withFile('sealed.pdf', sealed, (path) => run('qpdf', '--check', path))).toContain(
      'No syntax or stream encoding errors found',
    )
  })
})

describe('the room for the seal', () => {
  const objects = new Objects(sealed)

  it('is a field with a name for people, without size, printed and locked, on the first page', () => {
    const form = objects.dictionary(objects.catalog['/AcroForm'])
    expect(form['/SigFlags']).toBe(3)
    const [field] = objects.list(form['/Fields'])
    const described = objects.dictionary(field)
    expect(described).toMatchObject({
      '/FT': '/Sig',
      '/Subtype': '/Widget',
      '/F': 132,
      '/TU': 'u:Seal of Fenn & Moor Islanding',
    })
    const [left, bottom, right, top] = objects.list(described['/Rect'])
    expect([left, bottom]).toEqual([right, top])
    const [first] = objects.list(objects.dictionary(objects.catalog['/Pages'])['/Kids'])
    expect(objects.list(objects.dictionary(first)['/Annots'])).toEqual([field])
  })

  it('has its place in the structure tree, as PDF/UA asks', () => {
    const [form, ...others] = flat(structureOf(objects)).filter(({ type }) => type === '/Form')
    expect(others).toEqual([])
    const [kid] = objects.list(form?.entries['/K']).filter(isDictionary)
    const [field] = objects.list(objects.dictionary(objects.catalog['/AcroForm'])['/Fields'])
    expect(kid).toMatchObject({ '/Type': '/OBJR', '/Obj': field })
    expect(objects.dictionary(field)['/StructParent']).toEqual(expect.any(Number))
  })

  it('permits no change after the seal', () => {
    const permitted = objects.dictionary(objects.dictionary(objects.catalog['/Perms'])['/DocMDP'])
    const [reference] = objects.list(permitted['/Reference']).map((value) => objects.dictionary(value))
    expect(reference).toMatchObject({ '/TransformMethod': '/DocMDP' })
    expect(objects.dictionary(reference?.['/TransformParams'])).toMatchObject({ '/P': 1 })
  })
})
