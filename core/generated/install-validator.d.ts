/** Keywords that the schema judges by. */
export type ShapeKeyword =
  | 'type'
  | 'enum'
  | 'const'
  | 'not'
  | 'pattern'
  | 'minLength'
  | 'maxLength'
  | 'minimum'
  | 'exclusiveMinimum'
  | 'maximum'
  | 'minItems'
  | 'maxItems'
  | 'uniqueItems'
  | 'maxProperties'
  | 'required'
  | 'additionalProperties'
  | 'propertyNames'
  | 'false schema'
  | 'if'

/** One thing that the schema does not allow. */
export interface ShapeError {
  readonly instancePath: string
  readonly keyword: ShapeKeyword
  /** The key that it is about, where it is about one. */
  readonly params: Readonly<Record<string, unknown>>
}

declare const validate: {
  (data: unknown): boolean
  /** Of the last call that said false. */
  errors: readonly ShapeError[]
}
export default validate
