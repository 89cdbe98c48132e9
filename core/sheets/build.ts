import type { NotTested, Path, Sheet, SheetValue, Span, State } from '#core/glossary.ts'
import type { Measured } from '#core/install.ts'
import type { Known, Scene } from '#core/quantities/quantity.ts'
import { spanOf } from '#core/quantities/uncertainty.ts'
import type { SheetPlan } from './plan.ts'
import { PLANS } from './plans.ts'

interface Columns {
  readonly values: Record<string, SheetValue>
  readonly spans: Record<string, Span>
  readonly at: Record<string, Path>
}

const columns = (): Columns => ({ values: {}, spans: {}, at: {} })

function put(into: Columns, name: string, value: SheetValue | undefined): void {
  if (value !== undefined) into.values[name] = value
}

const taken = (measured: Measured | undefined): measured is Exclude<Measured, NotTested> =>
  measured !== undefined && 'value' in measured

function measure(
  into: Columns,
  field: { readonly name: string; readonly kind: Parameters<typeof spanOf>[1] },
  path: Path,
  measured: Measured | undefined,
  instrument: Parameters<typeof spanOf>[2],
): void {
  into.at[field.name] = path
  if (!taken(measured)) return
  into.values[field.name] = measured.value
  const span = spanOf(measured, field.kind, instrument)
  if (span.low !== span.high) into.spans[field.name] = span
}

function fillState<Item>(
  plan: SheetPlan<Item>,
  item: Item,
  scene: Scene,
  state: State,
  instrument: Parameters<typeof spanOf>[2],
): Columns {
  const into = columns()
  for (const field of plan.inState ?? []) {
    into.at[field.name] =
      typeof field.at === 'function' ? field.at(item, state) : [...plan.path(item, scene), ...field.at]
    put(into, field.name, field.value(item, scene, state))
  }
  for (const field of plan.measuredInState ?? [])
    measure(into, field, field.path(item, state), field.reading(item, scene, state), instrument)
  return into
}

function compute<Item>(plan: SheetPlan<Item>, item: Item, scene: Scene, into: Columns): void {
  const known: Record<string, SheetValue | undefined> = into.values as Record<string, SheetValue>
  for (const quantity of plan.quantities ?? [])
    put(into, quantity.name, quantity.compute(item, scene, known satisfies Known))
}

function sheetOf<Item>(plan: SheetPlan<Item>, item: Item, scene: Scene): Sheet {
  const named = plan.instrument?.(item, scene) ?? scene.install.readings?.with
  const instrument = named === undefined ? undefined : scene.install.instruments?.[named]
  const path = plan.path(item, scene)
  const common = columns()
  for (const field of plan.entered) {
    common.at[field.name] = typeof field.at === 'function' ? field.at(item) : [...path, ...field.at]
    put(common, field.name, field.value(item, scene))
  }
  for (const field of plan.measured ?? [])
    measure(common, field, field.path(item), field.reading(item, scene), instrument)
  compute(plan, item, scene, common)
  const grid = fillState(plan, item, scene, 'grid', instrument)
  const island = fillState(plan, item, scene, 'island', instrument)
  return {
    subject: plan.subject,
    id: plan.id(item),
    path,
    values: common.values,
    spans: common.spans,
    at: common.at,
    inState: { grid: grid.values, island: island.values },
    spansInState: { grid: grid.spans, island: island.spans },
    atInState: { grid: grid.at, island: island.at },
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
