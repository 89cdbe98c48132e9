import { type Ink, inks } from '#cli/formats/ink.ts'
import { colourOf, endWith, print } from '#cli/io.ts'
import { judgedFile } from '#cli/judged.ts'
import { type Comparison, compare, type ValueChange, type VerdictChange } from '#core/report/compare.ts'
import { STATE_WORDS } from '#core/texts/label.ts'
import { shown } from '#core/texts/value.ts'

const about = ({ subject, state }: ValueChange | VerdictChange): string =>
  state === null ? subject : `${subject} ${STATE_WORDS[state]}`

function verdictLine(change: VerdictChange, ink: Ink): string {
  const worse = change.after?.startsWith('fails') ?? false
  const arrow = `${change.before ?? 'not judged'} → ${change.after ?? 'not judged'}`
  return `  ${(worse ? ink.alarm : ink.water)(arrow)}  ${ink.strong(about(change))}  ${ink.faint(change.rule)}`
}

const isFlip = ({ before, after }: VerdictChange): boolean =>
  before !== 'not applicable' || (after?.startsWith('fails') ?? false)

function words({ verdicts, values }: Comparison, ink: Ink): string {
  const flips = verdicts.filter(isFlip)
  return [
    ...(flips.length === 0
      ? ['No verdict changed.']
      : ['Verdicts that changed', ...flips.map((change) => verdictLine(change, ink))]),
    '',
    ...(values.length === 0
      ? ['No value changed.']
      : [
          'Values that changed',
          ...values.map(
            (change) =>
              `  ${ink.strong(about(change))}  ${change.name}: ${shown(change.before, change.unit)} → ${shown(change.after, change.unit)}`,
          ),
        ]),
    '',
  ].join('\n')
}

/** Prints what changed between two files by meaning. */
export async function diff(
  before: string,
  after: string,
  { format, rulebook }: { readonly format: string; readonly rulebook?: string },
): Promise<void> {
  const old = await judgedFile(before, rulebook)
  const made = old && (await judgedFile(after, rulebook))
  if (!old || !made) return
  const comparison = compare(old.judged, made.judged)
  print(format === 'json' ? `${JSON.stringify(comparison, null, 2)}\n` : words(comparison, inks(colourOf('stdout'))))
  endWith(comparison.verdicts.length + comparison.values.length === 0 ? 0 : 1)
}
