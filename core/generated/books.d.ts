import type { StoredBook, StoredRule } from '#core/judge/shipped.ts'
export declare const RULES: () => readonly StoredRule[]
export declare const BOOKS: Readonly<Record<string, () => StoredBook>>
