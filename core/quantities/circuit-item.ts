import type { Circuit } from '#core/install.ts'
import type { Known, Scene } from './quantity.ts'

/** A circuit with its name in the file. */
export interface CircuitItem {
  readonly id: string
  readonly circuit: Circuit
}

/** A number computed earlier for the same subject. */
export function knownNumber(known: Known, name: string): number | undefined {
  const value = known[name]
  return typeof value === 'number' ? value : undefined
}

/** U0 of the file: line to neutral, V. */
export function nominalVoltage({ install }: Scene): number {
  return install.supply.nominal.voltage
}
