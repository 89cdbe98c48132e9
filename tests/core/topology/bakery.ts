import type { Cable, Circuit, Install } from '#core/install.ts'

export function cable(line: number, protective: number, cores: number, more: Partial<Cable> = {}): Cable {
  return { line, neutral: line, protective, cores, material: 'copper', conductor_class: 1, ...more }
}

/** A circuit of 2.5 mm² behind B16 that feeds nothing in particular. */
export function plainCircuit(fed_from: string, more: Partial<Circuit> = {}): Circuit {
  return {
    serves: 'Something',
    fed_from,
    phases: ['L1'],
    device: { kind: 'breaker', curve: 'B', rated: 16 },
    cable: cable(2.5, 2.5, 3, { insulation: 'pvc', method: 'C', length: 20 }),
    ...more,
  }
}

/** The bakery in the invented valley of Fennmark, normalised, without its readings. */
export const bakery: Install = {
  skerry: 1,
  report: { reference: 'FM-2026-031', purpose: 'initial verification', rulebook: 'iec' },
  site: { name: 'Alder Mill Bakery', address: ['Mill Lane 4', 'Fennmark'], premises: 'commercial' },
  supply: {
    operator: 'Fennmark Grid',
    earthing: 'TN-C-S',
    nominal: { voltage: 230, phases: 3, frequency: 50 },
    main_protection: { kind: 'fuse', curve: 'gG', rated: 63 },
    loop_impedance: { value: 0.24 },
    fault_current: { value: 2100 },
    separation: { required: 'all poles' },
  },
  earthing: { electrode: { kind: 'foundation', resistance: { value: 6.2 } }, earthing_conductor: 16 },
  boards: {
    MB: { name: 'Main board', fed_from: 'supply' },
    EB: { name: 'Backed-up board', fed_from: 'RCD1' },
  },
  overcurrent: { F35: { device: { kind: 'fuse', curve: 'gG', rated: 35 }, breaking: 50_000, fed_from: 'MB' } },
  changeover: {
    id: 'CO',
    fed_from: 'F35',
    operation: 'automatic',
    poles: 4,
    rated_current: 35,
    neutral_link: 'closes in island',
    cable: cable(10, 10, 5, { insulation: 'xlpe', method: 'B2', length: 6 }),
  },
  residual_current: { RCD1: { fed_from: 'CO', type: 'A', rated_current: 40, residual: 30 } },
  inverters: {
    INV: {
      fed_from: 'CO.load',
      phases: 3,
      rated_power: 10_000,
      island: { continuous: 10_000, fault_current: 24, shuts_down_within: 0.2 },
    },
  },
  arrays: {
    A1: {
      into: 'INV',
      modules_in_series: 16,
      strings: 1,
      module: { voc: 41.2, isc: 13.9 },
      max_input_voltage: 1000,
    },
  },
  circuits: {
    K1: {
      serves: 'Cold store',
      fed_from: 'EB',
      phases: ['L1'],
      device: { kind: 'breaker', curve: 'C', rated: 16, breaking: 6000 },
      cable: cable(2.5, 2.5, 3, {
        insulation: 'pvc',
        method: 'C',
        length: 18,
        ambient: 30,
        grouped: { circuits: 2, as: 'single layer' },
      }),
      load: { power: 1400, power_factor: 0.85 },
    },
    K2: {
      serves: 'Bakery sockets',
      fed_from: 'EB',
      phases: ['L2'],
      device: { kind: 'breaker', curve: 'B', rated: 16, breaking: 6000 },
      cable: cable(2.5, 2.5, 3, { insulation: 'pvc', method: 'B2', length: 22 }),
      load: { power: 1200 },
      sockets: true,
    },
    K7: {
      serves: 'Deck oven',
      fed_from: 'MB',
      phases: ['L1', 'L2', 'L3'],
      device: { kind: 'breaker', curve: 'B', rated: 32, breaking: 6000 },
      cable: cable(6, 6, 5, { insulation: 'pvc', method: 'C', length: 14 }),
      load: { power: 15_000 },
    },
  },
  instruments: {
    T1: { kind: 'multifunction installation tester', serial: '0417-A', calibrated: '2026-03-02', due: '2027-03-02' },
  },
}
