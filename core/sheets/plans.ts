import type { Subject } from '#core/glossary.ts'
import { arrayPlan } from './array.ts'
import { batteryPlan } from './battery.ts'
import { changeoverPlan } from './changeover.ts'
import { circuitPlan } from './circuit.ts'
import { overcurrentPlan, residualCurrentPlan } from './devices.ts'
import { installationPlan } from './installation.ts'
import { inverterPlan } from './inverter.ts'
import { busPlan, meterPlan } from './metering.ts'
import { earthingPlan, supplyPlan } from './origin.ts'
import type { FieldWords } from './plan.ts'
import { instrumentPlan, loadStepPlan, personPlan, transferPlan } from './record.ts'
import { stringPlan } from './string.ts'

/** Every kind of sheet, in the order of the report. */
export const PLANS = [
  installationPlan,
  supplyPlan,
  earthingPlan,
  changeoverPlan,
  overcurrentPlan,
  residualCurrentPlan,
  circuitPlan,
  inverterPlan,
  arrayPlan,
  stringPlan,
  batteryPlan,
  meterPlan,
  busPlan,
  instrumentPlan,
  transferPlan,
  loadStepPlan,
  personPlan,
] as const

function wordsOf(subject: Subject): ReadonlyMap<string, FieldWords> {
  const plan = PLANS.find((candidate) => candidate.subject === subject)
  const lists: readonly (readonly FieldWords[] | undefined)[] = [
    plan?.entered,
    plan?.quantities,
    plan?.inState,
    plan?.measured,
    plan?.measuredInState,
  ]
  return new Map(lists.flatMap((list) => list ?? []).map((field) => [field.name, field]))
}

const fields = new Map<Subject, ReadonlyMap<string, FieldWords>>()

/** Words for every field that a rule may name, by subject. */
export function fieldsOf(subject: Subject): ReadonlyMap<string, FieldWords> {
  const known = fields.get(subject) ?? wordsOf(subject)
  fields.set(subject, known)
  return known
}

/** Names of the fields that hold in one state only. */
export function stateFieldsOf(subject: Subject): ReadonlySet<string> {
  const plan = PLANS.find((candidate) => candidate.subject === subject)
  const lists: readonly (readonly FieldWords[] | undefined)[] = [plan?.inState, plan?.measuredInState]
  return new Set(lists.flatMap((list) => list ?? []).map(({ name }) => name))
}
