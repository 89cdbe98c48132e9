import { execFileSync } from 'node:child_process'

/** Everything that exiftool finds in a picture, by `group:name`. */
export function tagsOf(picture: Uint8Array): Readonly<Record<string, unknown>> {
  const output = execFileSync('exiftool', ['-j', '-G', '-n', '-a', '-'], { input: picture, encoding: 'utf8' })
  const [tags]: readonly Readonly<Record<string, unknown>>[] = JSON.parse(output)
  if (!tags) throw new Error('exiftool found no picture.')
  return tags
}
