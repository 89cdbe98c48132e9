import shapes from '#core/generated/sheet-shapes.js'
import type { Measured, NotTested, Path, Sheet, SheetValue, Span, State } from '#core/glossary.ts'
import type { Known, Scene } from '#core/quantities/quantity.ts'
import { spanOf } from '#core/quantities/uncertainty.ts'
import { placesOf } from './places.ts'
import type { SheetPlan } from './plan.ts'
import { PLANS } from './plans.ts'

type Values = Record<string, SheetValue | undefined>

interface Columns {
  readonly values: Values
  readonly spans: Record<string, Span>
}

type Instrument = Parameters<typeof spanOf>[2]
type Kind = Parameters<typeof spanOf>[1]

const columns = (values: Values): Columns => ({ values, spans: {} })

const taken = (measured: Measured | undefined): measured is Exclude<Measured, NotTested> =>
  measured !== undefined && 'value' in measured

function measure(
  into: Columns,
  name: string,
  kind: Kind,
  measured: Measured | undefined,
  instrument: Instrument,
): void {
  if (!taken(measured)) return
  into.values[name] = measured.value
  const span = spanOf(measured, kind, instrument)
  if (span.low !== span.high) into.spans[name] = span
}

function fillState<Item>(
  plan: SheetPlan<Item>,
  item: Item,
  scene: Scene,
  state: State,
  instrument: Instrument,
): Columns {
  const into = columns(shapes[plan.subject].inState())
  for (const field of plan.inState ?? []) into.values[field.name] = field.value(item, scene, state)
  for (const { name, kind, reading } of plan.measuredInState ?? [])
    measure(into, name, kind, reading(item, scene, state), instrument)
  return into
}

function compute<Item>(plan: SheetPlan<Item>, item: Item, scene: Scene, into: Columns): void {
  const known: Known = into.values
  for (const quantity of plan.quantities ?? []) into.values[quantity.name] = quantity.compute(item, scene, known)
}

function sheetOf<Item>(plan: SheetPlan<Item>, item: Item, scene: Scene): Sheet {
  const named = plan.instrument?.(item, scene) ?? scene.install.readings?.with
  const instrument = named === undefined ? undefined : scene.install.instruments?.[named]
  const path = plan.path(item, scene)
  const common = columns(shapes[plan.subject].common())
  for (const field of plan.entered) common.values[field.name] = field.value(item, scene)
  for (const { name, kind, reading } of plan.measured ?? [])
    measure(common, name, kind, reading(item, scene), instrument)
  compute(plan, item, scene, common)
  const grid = fillState(plan, item, scene, 'grid', instrument)
  const island = fillState(plan, item, scene, 'island', instrument)
  return {
    subject: plan.subject,
    id: plan.id(item),
    path,
    values: common.values,
    spans: common.spans,
    inState: { grid: grid.values, island: island.values },
    spansInState: { grid: grid.spans, island: island.spans },
    pathOf: (name: string, state: State | null): Path => placesOf(plan)(name, state, item, path),
  }
}

const sheetsBy = <Item>(plan: SheetPlan<Item>, scene: Scene): Sheet[] =>
  plan.items(scene).map((item) => sheetOf(plan, item, scene))

/**
 * The sheets of every subject of a file: what the rules see.
 *
 * @param scene the normalised file, its tree of supply and the rule book's parameters
 */
export function buildSheets(scene: Scene): Sheet[] {
  return PLANS.flatMap((plan) => sheetsBy(plan as SheetPlan<unknown>, scene))
}
