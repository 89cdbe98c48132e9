import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

export interface Certified {
  readonly key: string
  readonly cert: string
}

/** A key and a certificate for `localhost` that signs itself, made by openssl. */
export function certificateForLocalhost(): Certified {
  const folder = mkdtempSync(join(tmpdir(), 'skerry-tls-'))
  try {
    const [key, cert] = [join(folder, 'key.pem'), join(folder, 'cert.pem')]
    const curve = ['-newkey', 'ec', '-pkeyopt', 'ec_paramgen_curve:P-256', '-nodes', '-x509', '-days', '2']
    const names = ['-subj', '/CN=localhost', '-addext', 'subjectAltName=DNS:localhost']
    execFileSync('openssl', ['req', ...curve, ...names, '-keyout', key, '-out', cert], { stdio: 'ignore' })
    return { key: readFileSync(key, 'utf8'), cert: readFileSync(cert, 'utf8') }
  } finally {
    rmSync(folder, { recursive: true })
  }
}
