import table from '#schemas/tables/insulation-minima.json' with { type: 'json' }

export interface InsulationTest {
  /** V d.c. */
  readonly voltage: number
  /** MΩ */
  readonly minimum: number
}

/**
 * Test voltage and smallest insulation resistance of a circuit: 250 V and 0.5 MΩ up to 50 V, 500 V and 1 MΩ up to
 * 500 V, 1,000 V and 1 MΩ above.
 *
 * @param nominal highest voltage between two live conductors of the circuit, V
 * @source IEC 60364-6:2016, Table 6.1
 */
export function insulationTest(nominal: number): InsulationTest {
  const row = table.rows.find(({ upTo }) => nominal <= upTo) ?? table.above
  return { voltage: row.testVoltage, minimum: row.minimum }
}
