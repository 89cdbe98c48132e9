import { LINES } from '#core/glossary.ts'
import type { LoadStep, Transfer } from '#core/install/readings.ts'
import type { Instrument, Person } from '#core/install/record.ts'
import { entered, type MeasuredField, type SheetPlan } from './plan.ts'

export interface InstrumentItem {
  readonly id: string
  readonly instrument: Instrument
}

/** What the rules see of an instrument. Dates are texts in ISO 8601, which sort as they run. */
export const instrumentPlan: SheetPlan<InstrumentItem> = {
  subject: 'instrument',
  items: ({ install }) => Object.entries(install.instruments ?? {}).map(([id, instrument]) => ({ id, instrument })),
  id: ({ id }) => id,
  path: ({ id }) => ['instruments', id],
  entered: [
    entered('kind', '', 'Kind', ['kind'], ({ instrument }) => instrument.kind),
    entered('serial', '', 'Serial number', ['serial'], ({ instrument }) => instrument.serial),
    entered('calibrated', '', 'Calibrated on', ['calibrated'], ({ instrument }) => instrument.calibrated),
    entered('due', '', 'Calibration due', ['due'], ({ instrument }) => instrument.due),
    entered(
      'due_before_end',
      '',
      'Calibration ran out before the inspection ended',
      ['due'],
      ({ instrument }, { install }) => {
        const end = install.report.inspected?.to ?? install.report.inspected?.from
        return end === undefined ? undefined : instrument.due < end
      },
    ),
    entered(
      'calibrated_after_start',
      '',
      'Calibrated only after the inspection began',
      ['calibrated'],
      ({ instrument }, { install }) => {
        const start = install.report.inspected?.from
        return start === undefined ? undefined : instrument.calibrated > start
      },
    ),
    entered(
      'due_before_calibrated',
      '',
      'Due before it was calibrated',
      ['due'],
      ({ instrument }) => instrument.due <= instrument.calibrated,
    ),
  ],
}

export interface TransferItem {
  readonly index: number
  readonly transfer: Transfer
}

type TransferReading = 'dark_after' | 'restored_after' | 'observed' | 'gap'

function transferReading(name: TransferReading, title: string): MeasuredField<TransferItem> {
  return {
    name,
    unit: 's',
    title,
    kind: 'time',
    path: ({ index }) => ['readings', 'transfers', index, name],
    reading: ({ transfer }) => transfer[name],
  }
}

/** What the rules see of a transfer between the states. */
export const transferPlan: SheetPlan<TransferItem> = {
  subject: 'transfer',
  items: ({ install }) => (install.readings?.transfers ?? []).map((transfer, index) => ({ index, transfer })),
  id: ({ index }) => `transfer ${index + 1}`,
  path: ({ index }) => ['readings', 'transfers', index],
  entered: [
    entered('to', '', 'To the state', ['to'], ({ transfer }) => transfer.to),
    entered('cause', '', 'How it was brought about', ['cause'], ({ transfer }) => transfer.cause),
    entered('cause_upstream', '', 'By opening the supply upstream of the changeover', ['cause'], ({ transfer }) =>
      transfer.cause === undefined ? undefined : /upstream/i.test(transfer.cause),
    ),
    entered('poles_expected', '', 'Poles to be found dead', ['grid_terminals'], (_, { install }) => [
      ...LINES.slice(0, install.supply.nominal.phases),
      'N',
    ]),
    entered('poles_read', '', 'Poles that were read', ['grid_terminals'], ({ transfer }) =>
      Object.keys(transfer.grid_terminals ?? {}),
    ),
    entered('poles_not_read', '', 'Poles that were not read', ['grid_terminals'], ({ transfer }, { install }) =>
      [...LINES.slice(0, install.supply.nominal.phases), 'N'].filter(
        (pole) => !Object.hasOwn(transfer.grid_terminals ?? {}, pole),
      ),
    ),
    entered('reconnect_after', 's', "Waiting time set in the island's inverter", [], (_, { install, topology }) =>
      topology.inverters.island
        .map((id) => install.inverters?.[id]?.interface_protection?.reconnect_after)
        .find((time) => time !== undefined),
    ),
  ],
  measured: [
    transferReading('dark_after', 'From the loss of the grid to dead terminals'),
    transferReading('restored_after', 'From the loss of the grid to restored supply'),
    transferReading('observed', 'From the return of the grid to the transfer back'),
    transferReading('gap', 'Interruption at the transfer back'),
    ...([...LINES, 'N'] as const).map(
      (pole): MeasuredField<TransferItem> => ({
        name: `grid_${pole}`,
        unit: 'V',
        title: `Voltage left on the grid terminal ${pole}`,
        kind: 'voltage',
        path: ({ index }) => ['readings', 'transfers', index, 'grid_terminals', pole],
        reading: ({ transfer }) => transfer.grid_terminals?.[pole],
      }),
    ),
  ],
}

export interface LoadStepItem {
  readonly index: number
  readonly step: LoadStep
}

/** What the rules see of a load step in the island. */
export const loadStepPlan: SheetPlan<LoadStepItem> = {
  subject: 'load step',
  items: ({ install }) => (install.readings?.load_steps ?? []).map((step, index) => ({ index, step })),
  id: ({ index }) => `load step ${index + 1}`,
  path: ({ index }) => ['readings', 'load_steps', index],
  entered: [
    entered('step', '', 'What was switched', ['step'], ({ step }) => step.step),
    entered('tripped', '', 'The supply tripped', ['tripped'], ({ step }) => step.tripped),
    entered('nominal_voltage', 'V', 'Nominal voltage', [], (_, { install }) => install.supply.nominal.voltage),
    entered('nominal_frequency', 'Hz', 'Nominal frequency', [], (_, { install }) => install.supply.nominal.frequency),
    entered(
      'voltage_floor',
      'V',
      'Nominal voltage less 15 %',
      [],
      (_, { install }) => install.supply.nominal.voltage * 0.85,
    ),
    entered(
      'frequency_floor',
      'Hz',
      'Nominal frequency less 2 %',
      [],
      (_, { install }) => install.supply.nominal.frequency * 0.98,
    ),
  ],
  measured: [
    {
      name: 'lowest_voltage',
      unit: 'V',
      title: 'Lowest voltage',
      kind: 'voltage',
      path: ({ index }) => ['readings', 'load_steps', index, 'lowest_voltage'],
      reading: ({ step }) => step.lowest_voltage,
    },
    {
      name: 'lowest_frequency',
      unit: 'Hz',
      title: 'Lowest frequency',
      kind: 'frequency',
      path: ({ index }) => ['readings', 'load_steps', index, 'lowest_frequency'],
      reading: ({ step }) => step.lowest_frequency,
    },
  ],
}

export interface PersonItem {
  readonly role: 'designed_by' | 'installed_by' | 'tested_by'
  readonly person: Person
}

/** What the rules see of a person. */
export const personPlan: SheetPlan<PersonItem> = {
  subject: 'person',
  items: ({ install }) =>
    (['designed_by', 'installed_by', 'tested_by'] as const).flatMap((role) => {
      const person = install.people?.[role]
      return person ? [{ role, person }] : []
    }),
  id: ({ role }) => role.replace('_', ' '),
  path: ({ role }) => ['people', role],
  entered: [
    entered('role', '', 'Role', [], ({ role }) => role.replace('_', ' ')),
    entered('person', '', 'Name', ['name'], ({ person }) => person.name),
    entered('licence', '', 'Licence', ['licence'], ({ person }) => person.licence),
    entered('company', '', 'Company', ['company'], ({ person }) => person.company),
  ],
}
