import table from '#schemas/tables/changeover-classes.json' with { type: 'json' }

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
