import type { ShippedRule, StoredBook, StoredRule } from '#core/judge/shipped.ts'
export declare const RULES: () => readonly (StoredRule & Pick<ShippedRule, 'key'>)[]
export declare const BOOKS: Readonly<Record<string, () => StoredBook>>
