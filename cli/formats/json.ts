import type { FileResult, ShownFinding } from '#cli/result.ts'
import type { Format } from './format.ts'
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

/** The first book that judged a file stands for the run; each file names its own where there are several. */
function bookOf(results: readonly FileResult[]): FileResult['book'] {
  return results.find(({ book }) => book !== null)?.book ?? null
}

/** For other programs: stable names, positions counted from 1. */
export const json: Format = (results, { version }) => {
  const rulebook = bookOf(results)
  const files = results.map(({ file, outcome, findings, counts, book }) => ({
    file,
    outcome,
    ...(book !== null && book.hash !== rulebook?.hash && { rulebook: book }),
    findings: findings.map(finding),
    counts,
  }))
  return `${JSON.stringify({ version, rulebook, files }, null, 2)}\n`
}
