import type { Circuit } from '#core/install.ts'

/**
 * How a circuit's load lies between its conductors: between one line and neutral, spread over two lines and the
 * neutral, between two lines, or over three lines.
 */
export type Connection = 'line to neutral' | 'two lines and neutral' | 'line to line' | 'three lines'

/** The connection that a circuit's lines and the neutral of its cable make. */
export function connectionOf({ phases, cable }: Circuit): Connection {
  if (phases.length === 3) return 'three lines'
  if (phases.length === 1) return 'line to neutral'
  return cable.neutral === undefined ? 'line to line' : 'two lines and neutral'
}

/** Times U0: the voltage that one ampere in each line works with. */
const POWER_FACTORS = {
  'line to neutral': 1,
  'two lines and neutral': 2,
  'line to line': Math.sqrt(3),
  'three lines': 3,
} as const satisfies Record<Connection, number>

/**
 * Active power in W that a current of 1 A at power factor 1 carries: U0 on one line, √3·U with U = √3·U0 on three.
 *
 * @param voltage U0, line to neutral, V
 */
export function powerPerAmpere(voltage: number, connection: Connection): number {
  return voltage * POWER_FACTORS[connection]
}

/**
 * Design current Ib of a balanced load in A: P/(U0·cosφ) on one line, P/(√3·U·cosφ) on three with U = √3·U0.
 *
 * @param power P in W
 * @param voltage U0, line to neutral, V, above 0
 * @param powerFactor cosφ, above 0, up to 1
 * @source definition of active power; IEC 60364-1, 311 for the design current
 */
export function designCurrent(power: number, voltage: number, connection: Connection, powerFactor: number): number {
  return power / (powerPerAmpere(voltage, connection) * powerFactor)
}

/** Design current of a circuit in A; the datasheet's current wins over its power. Undefined where neither is stated. */
export function circuitDesignCurrent(circuit: Circuit, voltage: number): number | undefined {
  const { load } = circuit
  if (load?.current !== undefined) return load.current
  if (load?.power === undefined) return undefined
  return designCurrent(load.power, voltage, connectionOf(circuit), load.power_factor ?? 1)
}

/** Active power of a circuit's load in W, from its power or else its current. Undefined where neither is stated. */
export function circuitPower(circuit: Circuit, voltage: number): number | undefined {
  const { load } = circuit
  if (load?.power !== undefined) return load.power
  if (load?.current === undefined) return undefined
  return load.current * powerPerAmpere(voltage, connectionOf(circuit)) * (load.power_factor ?? 1)
}
