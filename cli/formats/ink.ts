/** The few colours of the terminal: ink and water, one lamp, an alarm. */
export interface Ink {
  readonly strong: (text: string) => string
  readonly faint: (text: string) => string
  readonly water: (text: string) => string
  readonly lamp: (text: string) => string
  readonly alarm: (text: string) => string
  readonly sound: (text: string) => string
}

const plain = (text: string): string => text
const painted =
  (on: number, off: number) =>
  (text: string): string =>
    `\u001b[${on}m${text}\u001b[${off}m`

/** Inks that paint, or leave text as it is. */
export function inks(colour: boolean): Ink {
  if (!colour) return { strong: plain, faint: plain, water: plain, lamp: plain, alarm: plain, sound: plain }
  return {
    strong: painted(1, 22),
    faint: painted(2, 22),
    water: painted(36, 39),
    lamp: painted(33, 39),
    alarm: painted(31, 39),
    sound: painted(32, 39),
  }
}
