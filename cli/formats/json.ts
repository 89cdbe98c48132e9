import type { FileResult, ShownFinding } from '#cli/result.ts'
import { between, type Format, indented, listFrame } from './format.ts'
import { pointer } from './pointer.ts'

function finding({
  rule,
  subject,
  state,
  verdict,
  severity,
  message,
  remedy,
  path,
  range,
  related,
  departure,
}: ShownFinding): object {
  return {
    rule,
    subject,
    state,
    verdict,
    severity,
    message,
    ...(remedy !== '' && { remedy }),
    path: pointer(path),
    line: range.line,
    column: range.column,
    related: related.map((place) => ({
      path: pointer(place.path),
      line: place.range.line,
      column: place.range.column,
    })),
    ...(departure && { departure }),
  }
}

/**
 * For other programs: stable names, positions counted from 1. The first book that judged a file stands for the run; a
 * file names its own where that is another one.
 */
export const json: Format = ({ version }) => {
  let rulebook: FileResult['book'] = null
  const separator = between(',\n')
  return {
    take({ file, outcome, findings, counts, book }) {
      rulebook ??= book
      const own = book !== null && book.hash !== rulebook?.hash
      const content = { file, outcome, ...(own && { rulebook: book }), findings: findings.map(finding), counts }
      return `${separator()}${indented(content, 4)}`
    },
    frame: () => listFrame({ version, rulebook, files: [] }, 'files', 2, separator() !== ''),
  }
}
