import type { Install } from '#core/install.ts'
import { type EnteredField, entered } from './plan.ts'

/** Items of the inspection that rules of one book or another ask for by name. Others may be added to the list at will. */
export const INSPECTION_ITEMS = [
  'dual-supply notices',
  'backed-up circuits labelled',
  'single-line diagram at the board',
  'conductor identification',
  'terminals tight',
  'fire sealing',
  'barriers and enclosures',
  'isolation and switching',
  'array cables and connectors',
  'battery mounting and clearances',
  'multiple mode inverter warning',
  'emergency services sign',
] as const

/** The sheet field that holds an item's result: `item_fire_sealing`. */
export const itemField = (item: string): string => `item_${item.replace(/[^a-z]+/g, '_')}`

/** One field for each of the known items, with its result; missing where the list does not have it. */
export const inspectionFields: readonly EnteredField<Install>[] = INSPECTION_ITEMS.map((wanted) =>
  entered(
    itemField(wanted),
    '',
    `Inspection: ${wanted}`,
    ['inspection'],
    ({ inspection }) => inspection?.find(({ item }) => item === wanted)?.result,
  ),
)
