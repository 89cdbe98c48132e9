import { ownFile, print } from '#cli/io.ts'
import text from '#core/generated/install-schema.js'

/** Prints the schema of the install file: the norm (2020-12), or its twin for editors. */
export function schema({ draft07 }: { readonly draft07?: true }): void {
  print(
    draft07
      ? new TextDecoder().decode(ownFile('install.draft-07.schema.json'))
      : `${JSON.stringify(JSON.parse(text()), null, 2)}\n`,
  )
}
