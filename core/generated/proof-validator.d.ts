import type { Proof } from '#core/register/proof.ts'

/** Whether a value is a proof of a place in a register, as schemas/proof.schema.json has it. */
declare const validate: (value: unknown) => value is Proof
export default validate
