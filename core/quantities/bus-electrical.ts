import type { Bus } from '#core/install/meter.ts'
import values from '#schemas/tables/bus-values.json' with { type: 'json' }
import type { Quantity } from './quantity.ts'

/**
 * Resistance in Ω across the pair of a bus with its power off: 120 Ω over the count of terminating resistors.
 *
 * @param terminators count, 1 or more; undefined for none, when nothing definite is across the pair
 * @source TIA/EIA-485: four makers' manuals ask for 120 Ω at both ends
 */
export function terminationExpected(terminators: number): number | undefined {
  return terminators > 0 ? values.terminator / terminators : undefined
}

/**
 * Voltage in mV between the wires of an idle bus: V·Rt/(2Rb + Rt), Rt the terminating resistors in parallel with 12 kΩ
 * for each unit load. A receiver needs 200 mV (TIA-485, from memory).
 *
 * @param voltage V of the bias, V
 * @param resistors Rb, each of the two bias resistors, Ω, above 0
 * @param unitLoads what the receivers put on the bus, 0 or more
 * @source voltage divider; own derivation
 */
export function biasVoltage(voltage: number, resistors: number, terminators: number, unitLoads: number): number {
  const conductance = terminators / values.terminator + unitLoads / values.unitLoad
  return (1000 * voltage) / (1 + 2 * resistors * conductance)
}

function terminatorsOf(bus: Bus | undefined): number | undefined {
  return bus?.kind === 'RS-485' ? bus.terminated_at?.length : undefined
}

/** What is computed for a link, for the meter that has it and for the link itself. */
export function busQuantities<Item>(busOf: (item: Item) => Bus | undefined, place: string): Quantity<Item>[] {
  return [
    {
      name: 'termination_expected',
      unit: 'Ω',
      title: 'Resistance to be expected across the pair, power off',
      formula: '120 Ω / count of terminating resistors, RS-485 only',
      source: 'TIA/EIA-485, as printed in four makers’ manuals',
      from: [`${place}kind`, `${place}terminated_at`],
      compute: (item) => {
        const terminators = terminatorsOf(busOf(item))
        return terminators === undefined ? undefined : terminationExpected(terminators)
      },
    },
    {
      name: 'bias_voltage',
      unit: 'mV',
      title: 'Voltage of the idle pair',
      formula: 'V · Rt / (2 · Rb + Rt), Rt of the terminating resistors and 12 kΩ for each unit load in parallel',
      source: 'voltage divider; 12 kΩ from memory of TIA/EIA-485',
      from: [`${place}bias`, `${place}terminated_at`],
      compute: (item) => {
        const bus = busOf(item)
        const terminators = terminatorsOf(bus)
        if (bus?.bias === undefined || terminators === undefined) return undefined
        return biasVoltage(bus.bias.voltage, bus.bias.resistors, terminators, bus.bias.unit_loads ?? 0)
      },
    },
  ]
}
