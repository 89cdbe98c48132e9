/**
 * Makes installations of any size for measuring: sound in shape, plausible in value, the same for the same numbers.
 */

/** A small generator of chance (xorshift32): the same seed gives the same file on every machine. */
function chance(seed: number): () => number {
  let state = (seed * 2654435761 + 1) >>> 0 || 1
  return () => {
    state ^= state << 13
    state >>>= 0
    state ^= state >>> 17
    state ^= state << 5
    state >>>= 0
    return state / 2 ** 32
  }
}

const SERVES = [
  'Sockets',
  'Lights',
  'Cold store',
  'Workshop',
  'Pump',
  'Office',
  'Heat pump',
  'Ventilation',
  'Door',
  'Server',
] as const
const CABLES = [
  { type: '3G1.5', size: 1.5, perMetre: 0.0242, rated: 10 },
  { type: '3G2.5', size: 2.5, perMetre: 0.01482, rated: 16 },
  { type: '3G4', size: 4, perMetre: 0.00922, rated: 20 },
] as const

const pick = <T>(list: readonly T[], at: number): T => {
  const item = list[Math.floor(at * list.length)]
  if (item === undefined) throw new Error('The list to pick from is empty.')
  return item
}

interface Row {
  readonly id: string
  readonly design: string
  readonly reading: string
}

function row(index: number, next: () => number): Row {
  const id = `K${index + 1}`
  const cable = pick(CABLES, next())
  const length = 5 + Math.round(next() * 20)
  const backedUp = next() < 0.6
  const continuity = (cable.perMetre * length).toFixed(2)
  const loop = (0.24 + cable.perMetre * length).toFixed(2)
  const power = Math.round(100 + next() * 900)
  return {
    id,
    design: `  ${id}:
    serves: ${pick(SERVES, next())} ${index + 1}
    fed_from: ${backedUp ? 'EB' : 'RCD0'}
    phases: [ L${1 + (index % 3)} ]
    device: { breaker: B${cable.rated}, breaking: 6 kA }
    cable: { type: ${cable.type}, insulation: pvc, method: C, length: ${length} m }
    load: { power: ${power} W, daily_energy: ${power * 6} Wh }
`,
    reading: `    ${id}: { continuity: ${continuity} ohm, insulation: ${Math.round(50 + next() * 900)} MΩ at 500 V, polarity: correct, loop: { grid: ${loop} ohm } }
`,
  }
}

/** An install file as text. `circuits` from 1 to about 1,500: more would go beyond the reader's bounds. */
export function synthesize(circuits: number, seed: number): string {
  const next = chance(seed)
  const rows = Array.from({ length: circuits }, (_, index) => row(index, next))
  return `# A made installation for measuring: ${circuits} circuits, number ${seed}.
skerry: 1
report: { reference: FM-M-${seed}, purpose: initial verification, rulebook: iec, inspected: { from: "2026-05-04" }, next_due: "2030-05-04" }
site:
  name: Measured House ${seed}
  address: [ Long Row ${seed}, Fennmark ]
  position: { latitude: 47.3, longitude: 9.6, altitude: 300 m }
  lowest_temperature: -12 °C
  premises: commercial
supply:
  operator: Fennmark Grid
  earthing: TN-S
  nominal: { voltage: 230 V, phases: 3, frequency: 50 Hz }
  main_protection: { fuse: gG 63, breaking: 50 kA }
  loop_impedance: 0.22 ohm
  fault_current: 2.1 kA
  separation: { required: all poles, stated_in: "Connection conditions 2025, sheet 7" }
earthing:
  electrode: { kind: foundation, resistance: 6.2 ohm }
  earthing_conductor: 16 mm²
  bonding: [ { to: water pipe, size: 10 mm², continuity: 0.03 ohm } ]
boards:
  MB: { name: Main board, fed_from: supply }
  EB: { name: Backed-up board, fed_from: RCD1 }
overcurrent:
  F35: { device: gG 35, breaking: 50 kA, fed_from: MB }
changeover:
  id: CO
  fed_from: F35
  operation: automatic
  poles: 4
  rated_current: 35 A
  neutral_link: closes in island
  interlock: [ electrical, mechanical ]
  cable: { type: 5G10, insulation: xlpe, method: B2, length: 6 m }
residual_current:
  RCD0: { fed_from: MB, type: A, rated_current: 63 A, residual: 30 mA }
  RCD1: { fed_from: CO, type: A, rated_current: 40 A, residual: 30 mA }
inverters:
  INV: { fed_from: CO.load, phases: 3, rated_power: 10 kVA, island: { continuous: 10 kVA, peak: 15 kVA, fault_current: 40 A, shuts_down_within: 0.2 s }, settings: { island_voltage: 230 V, held_back_charge: 40 %, low_charge_alarm: 20 % } }
batteries:
  BAT: { into: INV, chemistry: lithium iron phosphate, usable: 9.6 kWh, max_discharge: 5.1 kW, efficiency: 95 %, place: utility room }
circuits:
${rows.map(({ design }) => design).join('')}instruments:
  T1: { kind: multifunction installation tester, serial: "0417-A", calibrated: "2026-03-02", due: "2027-03-02" }
readings:
  with: T1
  circuits:
${rows.map(({ reading }) => reading).join('')}people:
  installed_by: { name: A. Fenn, licence: FM-1182 }
  tested_by: { name: B. Reed, licence: FM-0977 }
`
}
