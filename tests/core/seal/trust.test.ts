import { generateKeyPairSync } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { verifySignature } from '#core/seal/algorithms.ts'
import { type KnownCertificate, readCertificate } from '#core/seal/certificate.ts'
import { OID } from '#core/seal/names.ts'
import { certificatesFrom, pemOf } from '#core/seal/pem.ts'
import { followChain } from '#core/seal/trust.ts'
import { run, withFile } from '../../paper/tools.ts'
import { type Person, person, root, sealer } from './people.ts'

const AT = new Date('2026-10-21T09:30:05Z')
const known = (der: Uint8Array): KnownCertificate => {
  const certificate = readCertificate(der)
  if (!certificate) throw new Error('no certificate')
  return certificate
}
const own = ({ certificates }: Person): KnownCertificate => known(certificates[0])
const subtle = crypto.subtle

async function follow(signer: Person, trusted: readonly Person[] | undefined, others?: readonly Uint8Array[], at = AT) {
  const [first, ...rest] = signer.certificates
  return followChain({ own: known(first), others: (others ?? rest).map(known), trusted: trusted?.map(own), at, subtle })
}

const changed = (der: Uint8Array, at: number): Uint8Array => der.map((byte, index) => (index === at ? byte ^ 1 : byte))
const middle = person('Middle', 'authority', root)
const below = person('Below', 'seal', middle)
const twin = person('Root', 'authority')
const past = { from: new Date('2020-01-01T00:00:00Z'), until: new Date('2021-01-01T00:00:00Z') }
const late = person('Late', 'authority', undefined, past)

describe('a certificate is not trusted', () => {
  it.each([
    ['by someone who trusts somebody else', sealer, [middle], undefined, 'No certificate that is trusted here'],
    ['by someone who trusts a namesake of its root', sealer, [twin], undefined, 'was changed, or is not signed by'],
    [
      'by someone who trusts a namesake of an issuer that did not come along',
      sealer,
      [twin],
      [],
      'was changed, or is not signed by',
    ],
    [
      'before it is valid',
      person('Early', 'seal', root, { from: new Date('2027-01-01T00:00:00Z') }),
      [root],
      undefined,
      'was valid from 2027-01-01',
    ],
    ['after it ended', person('Old', 'seal', root, past), [root], undefined, 'not on 2026-10-21'],
    ['under a root that ended', person('Under', 'seal', late), [late], [], 'was valid from 2020-01-01'],
    [
      'from somebody who may not issue any',
      person('Third', 'seal', sealer),
      [root],
      undefined,
      'may not issue certificates',
    ],
    [
      'along with one that leads nowhere',
      sealer,
      [root],
      [...root.certificates, ...middle.certificates.slice(0, 1)],
      'leads nowhere',
    ],
    [
      'where that of the issuer was changed',
      sealer,
      [root],
      [changed(root.certificates[0], root.certificates[0].length - 1)],
      'was changed',
    ],
  ])('%s', async (_, signer, trusted, others, words) => {
    expect(await follow(signer, trusted, others)).toMatchObject({
      holds: false,
      trusted: false,
      says: expect.stringContaining(words),
    })
  })

  it('in a chain without end', async () => {
    let last = root
    const links: Person[] = []
    for (let step = 0; step < 9; step += 1) {
      last = person(`Link ${step}`, 'authority', last)
      links.push(last)
    }
    expect(await follow(last, [root])).toMatchObject({ holds: false })
  })
})

describe('a certificate is trusted', () => {
  it.each([
    ['that leads to a trusted one', sealer, [root], undefined],
    ['whose issuer did not come along', sealer, [root], []],
    ['over one between', below, [root], undefined],
    ['that leads to one below the root', below, [middle], middle.certificates.slice(0, 1)],
    ['that is trusted itself', sealer, [sealer], []],
  ])('%s', async (_, signer, trusted, others) => {
    expect(await follow(signer, trusted, others)).toMatchObject({ holds: true, trusted: true })
  })

  it('or left open, where nobody was named', async () => {
    expect(await follow(sealer, undefined)).toMatchObject({ holds: true, trusted: false, open: true })
  })
})

describe('a signature', () => {
  const data = new Uint8Array(5)
  const key = own(sealer).key
  it.each([
    ['by an algorithm that is not known', { algorithm: '1.2.840.113549.1.1.5', key }, 'weak'],
    ['by RSA with a key of a curve', { algorithm: OID.rsaSha256, key }, 'weak'],
    [
      'on a curve that is not known',
      {
        algorithm: OID.ecdsaSha256,
        key: new Uint8Array(
          generateKeyPairSync('ec', { namedCurve: 'secp256k1' }).publicKey.export({ type: 'spki', format: 'der' }),
        ),
      },
      'weak',
    ],
    ['by a key that is none', { algorithm: OID.ecdsaSha256, key: changed(key, key.length - 1) }, 'wrong'],
    ['that is none', { algorithm: OID.ecdsaSha256, key }, 'wrong'],
  ])('%s: %s', async (_, change, verdict) => {
    const signature = new Uint8Array(change.key === key ? [1] : [0x30, 6, 2, 1, 1, 2, 1, 1])
    expect(await verifySignature({ data, signature, ...change }, subtle)).toBe(verdict)
  })
})

describe('bytes are no certificate', () => {
  const der = sealer.certificates[0]
  it.each([
    ['that are cut', der.slice(0, -1)],
    ['that go on', Uint8Array.from([...der, 0])],
    ['that are empty', new Uint8Array()],
  ])('%s', (_, bytes) => expect(readCertificate(bytes)).toBeUndefined())

  it('that hold something critical that is not understood', () => {
    const config = '[req]\ndistinguished_name=dn\n[dn]\n[ext]\nnameConstraints=critical,permitted;DNS:fennmark.test\n'
    const made = withFile('conf', new Uint8Array(Buffer.from(config)), (path) =>
      run(
        'openssl',
        'req',
        '-x509',
        '-newkey',
        'ec',
        '-pkeyopt',
        'ec_paramgen_curve:P-256',
        '-nodes',
        '-keyout',
        '/dev/null',
        '-subj',
        '/CN=Odd',
        '-config',
        path,
        '-extensions',
        'ext',
      ),
    )
    const [odd = new Uint8Array()] = certificatesFrom(made)
    expect(odd.length).toBeGreaterThan(100)
    expect(readCertificate(odd)).toBeUndefined()
  })
})

describe('a certificate', () => {
  it('is read from PEM with words around it, and written as it was', () => {
    const [first, second] = sealer.certificates
    const text = `for the record\n${pemOf(first)}and its root\r\n${pemOf(second ?? first).replaceAll('\n', '\r\n')}`
    expect(certificatesFrom(text)).toEqual([first, second])
    expect(certificatesFrom('-----BEGIN CERTIFICATE-----\n%\n-----END CERTIFICATE-----\n')).toEqual([])
    expect(certificatesFrom('-----BEGIN CERTIFICATE-----\nA\n-----END CERTIFICATE-----\n')).toEqual([])
  })

  it('made here is one that OpenSSL takes', () => {
    withFile('chain.pem', new Uint8Array(Buffer.from(sealer.certificates.map(pemOf).join(''))), (chain, folder) =>
      withFile('root.pem', new Uint8Array(Buffer.from(pemOf(root.certificates[0]))), (trusted) => {
        expect(folder).not.toBe('')
        const when = String(AT.getTime() / 1000)
        expect(
          run('openssl', 'verify', '-x509_strict', '-purpose', 'smimesign', '-attime', when, '-CAfile', trusted, chain),
        ).toContain(': OK')
      }),
    )
  })
})
