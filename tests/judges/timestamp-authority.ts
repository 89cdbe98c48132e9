import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

const CONFIG = `[req]
distinguished_name = dn
[dn]
[ca]
basicConstraints = critical,CA:TRUE
keyUsage = critical,keyCertSign
[tsa]
keyUsage = critical,digitalSignature
extendedKeyUsage = critical,timeStamping
[tsa_config]
serial = serial
signer_digest = sha256
default_policy = 1.2.3.4.1
digests = sha256, sha384
accuracy = secs:1
ess_cert_id_chain = no
ess_cert_id_alg = sha256
`

export interface Authority {
  /** Answers a request as an authority would over HTTP. */
  readonly answer: (request: Uint8Array) => Promise<Uint8Array>
  /** DER of its root. */
  readonly root: Uint8Array
  readonly close: () => void
}

interface Shape {
  readonly key?: readonly string[]
  readonly digest?: 'sha256' | 'sha384' | 'sha1'
}

const EC = ['-newkey', 'ec', '-pkeyopt', 'ec_paramgen_curve:P-256'] as const

/** A time-stamp authority made of OpenSSL, with a root of its own. */
export function openAuthority({ key = EC, digest = 'sha256' }: Shape = {}): Authority {
  const folder = mkdtempSync(join(tmpdir(), 'skerry-tsa-'))
  const openssl = (...words: string[]): Buffer =>
    execFileSync('openssl', words, { cwd: folder, stdio: ['ignore', 'pipe', 'pipe'] })
  writeFileSync(join(folder, 'conf'), CONFIG)
  writeFileSync(join(folder, 'serial'), '01\n')
  openssl(
    'req',
    '-x509',
    ...EC,
    '-nodes',
    '-keyout',
    'root.key',
    '-out',
    'root.pem',
    '-days',
    '9000',
    '-subj',
    '/O=Fennmark Time/CN=Root',
    '-config',
    'conf',
    '-extensions',
    'ca',
  )
  openssl(
    'req',
    ...key,
    '-nodes',
    '-keyout',
    'tsa.key',
    '-out',
    'tsa.csr',
    '-subj',
    '/O=Fennmark Time/CN=Clock',
    '-config',
    'conf',
  )
  openssl(
    'x509',
    '-req',
    '-in',
    'tsa.csr',
    '-CA',
    'root.pem',
    '-CAkey',
    'root.key',
    '-set_serial',
    '7',
    '-days',
    '9000',
    '-out',
    'tsa.pem',
    '-extfile',
    'conf',
    '-extensions',
    'tsa',
  )
  openssl('x509', '-in', 'root.pem', '-outform', 'der', '-out', 'root.der')
  return {
    root: new Uint8Array(readFileSync(join(folder, 'root.der'))),
    close: () => rmSync(folder, { recursive: true }),
    answer: async (request) => {
      writeFileSync(join(folder, 'request'), request)
      const signing = ['-inkey', 'tsa.key', '-signer', 'tsa.pem', `-${digest}`]
      openssl(
        'ts',
        '-reply',
        '-config',
        'conf',
        '-section',
        'tsa_config',
        '-queryfile',
        'request',
        ...signing,
        '-out',
        'reply',
      )
      return new Uint8Array(readFileSync(join(folder, 'reply')))
    },
  }
}
