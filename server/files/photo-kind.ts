/** What bytes are, by their first ones. */
export type PhotoKind = 'JPEG' | 'PNG' | 'WebP' | 'HEIC'

interface Signature {
  readonly kind: string
  readonly at: number
  readonly starts: string
}

/** Kinds that photos come in, and kinds that people send instead. `starts` is read as Latin-1. */
const SIGNATURES: readonly Signature[] = [
  { kind: 'JPEG', at: 0, starts: '\xff\xd8\xff' },
  { kind: 'PNG', at: 0, starts: '\x89PNG\r\n\x1a\n' },
  { kind: 'WebP', at: 8, starts: 'WEBP' },
  ...['heic', 'heix', 'hevc', 'hevx', 'heim', 'heis'].map((brand) => ({ kind: 'HEIC', at: 8, starts: brand })),
  ...['mif1', 'msf1'].map((brand) => ({ kind: 'HEIC', at: 8, starts: brand })),
  { kind: 'AVIF', at: 8, starts: 'avif' },
  { kind: 'PDF', at: 0, starts: '%PDF-' },
  { kind: 'zip', at: 0, starts: 'PK' },
  { kind: 'GIF', at: 0, starts: 'GIF8' },
  { kind: 'TIFF', at: 0, starts: 'II*\0' },
  { kind: 'TIFF', at: 0, starts: 'MM\0*' },
  { kind: 'BMP', at: 0, starts: 'BM' },
  { kind: 'video', at: 4, starts: 'ftyp' },
]

const PHOTOS: readonly string[] = ['JPEG', 'PNG', 'WebP', 'HEIC'] satisfies readonly PhotoKind[]

const isPhoto = (kind: string): kind is PhotoKind => PHOTOS.includes(kind)

/** SVG, HTML and YAML have no signature: the first sign that is not white space gives them away. */
function textKind(head: string): string | undefined {
  if (/^(?:\xef\xbb\xbf)?\s*<[?!a-z]/i.test(head)) return /<svg[\s>]/i.test(head) ? 'SVG' : 'HTML or XML'
  return /^[\t\r\n\x20-\x7e\x80-\xff]*$/.test(head) ? 'text' : undefined
}

/** The kind of a photo by its content, or the name of what it is instead. Its name and declared type count for nothing. */
export function photoKind(bytes: Uint8Array): { readonly photo: PhotoKind } | { readonly other: string } {
  const head = Buffer.from(bytes.subarray(0, 1024)).toString('latin1')
  const kind = SIGNATURES.find(({ at, starts }) => head.startsWith(starts, at))?.kind ?? textKind(head)
  if (kind === undefined) return { other: 'of an unknown kind' }
  return isPhoto(kind) ? { photo: kind } : { other: kind }
}
