import type { Cable, Install } from '#core/install.ts'
import { cableName, deviceName, residualName } from '../devices.ts'
import { amount } from '../print.ts'
import { sure } from '../sure.ts'
import type { Part } from './parts.ts'

/** Part of its size that a letter is wide, on average and a little more. */
const LETTER = 0.52

/** About how wide words are, in units of the drawing: a little more than half their size a letter. */
const wide = (words: string, size: number): number => words.length * size * LETTER

/** Words cut to a width. */
export function cut(words: string, width: number, size: number): string {
  if (wide(words, size) <= width) return words
  return `${words.slice(0, Math.max(1, Math.floor(width / (size * LETTER)) - 1)).trimEnd()}…`
}

/** Words that stand with a part. */
interface Told {
  readonly above?: string
  readonly below?: readonly string[]
}

/** The cable that leads to a part, behind what stands before it: nothing where none is stated. */
export const cabled = (cable: Cable | undefined): string[] => (cable === undefined ? [] : [cableName(cable)])

/** Name and ratings of a part, with the cable that leads to it. */
export function told({ id, kind }: Part, install: Install): Told {
  const { supply, changeover } = install
  switch (kind) {
    case 'meter':
      return { above: id }
    case 'main protection':
      return { below: [deviceName(supply.main_protection)] }
    case 'overcurrent device': {
      const found = sure(install.overcurrent?.[id], id)
      const breaking = found.breaking ?? found.device.breaking
      const breaks = breaking === undefined ? [] : [amount(breaking, 'A')]
      return { above: id, below: [deviceName(found.device), ...breaks, ...cabled(found.cable)] }
    }
    case 'residual-current device': {
      const found = sure(install.residual_current?.[id], id)
      return { above: id, below: [residualName(found), amount(found.rated_current, 'A'), ...cabled(found.cable)] }
    }
    case 'changeover':
      return { above: `${id} · ${changeover.poles} poles · ${amount(changeover.rated_current, 'A')}` }
    case 'inverter': {
      const { rated_power, cable } = sure(install.inverters?.[id], id)
      return { above: [id, amount(rated_power, 'VA'), ...cabled(cable)].join(' · ') }
    }
    default:
      return {}
  }
}
