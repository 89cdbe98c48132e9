import type { Measured } from '#core/glossary.ts'
import type { Transfer } from '#core/install/readings.ts'
import table from '#schemas/tables/changeover-classes.json' with { type: 'json' }
import type { Family } from './quantity.ts'

const CLASSES = ['uninterrupted', 'very short', 'short', 'average', 'medium'] as const

/** How long a changeover leaves the loads without supply, in a word. */
export type ChangeoverClass = (typeof CLASSES)[number] | 'long'

/**
 * The class of a changeover: uninterrupted at 0 s, very short up to 0.15 s, short up to 0.5 s, average up to 5 s,
 * medium up to 15 s, long above. A word to describe it with, never a limit: standby supplies are outside the list.
 *
 * @param time s without supply, 0 or more
 * @source IEC 60364-5-56, as printed in OVE E 8101:2019, part 5-56
 */
export function changeoverClass(time: number): ChangeoverClass {
  return CLASSES.find((name) => time <= table.upTo[name]) ?? 'long'
}

/** A time that was read inside the instrument's range; 0 s is one, since nothing was interrupted then. */
function exactTime(reading: Measured | undefined): number | undefined {
  return reading && 'value' in reading && reading.bound === undefined ? reading.value : undefined
}

/** Everything computed for a transfer between the states. */
export const transferFamily: Family<{ readonly transfer: Transfer }> = {
  subject: 'transfer',
  quantities: [
    {
      name: 'changeover_class',
      unit: '',
      title: 'Class of the changeover',
      formula:
        'to the island by the time from the loss of the grid to restored supply, to the grid by the interruption; ' +
        'a word, never a limit',
      source: 'IEC 60364-5-56, as printed in OVE E 8101:2019, part 5-56; standby supplies are outside its scope',
      from: ['to', 'restored_after', 'gap'],
      compute: ({ transfer }) => {
        const time = exactTime(transfer.to === 'island' ? transfer.restored_after : transfer.gap)
        return time === undefined ? undefined : changeoverClass(time)
      },
    },
  ],
}
