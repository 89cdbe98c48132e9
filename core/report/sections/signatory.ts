import type { Signatory } from '../issue.ts'

/** A person with the licence behind the name. */
export function signatoryText({ name, licence }: Signatory): string {
  return licence === undefined ? name : `${name}, licence ${licence}`
}
