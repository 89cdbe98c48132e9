import { Readable } from 'node:stream'
import { text } from 'node:stream/consumers'
import { setTimeout as wait } from 'node:timers/promises'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Cell, csvRow, csvStream, harmless } from '#server/exports/csv.ts'
import { python } from '#tests/judges/python.ts'

/** Python's own reader of CSV, strict, over the bytes as they would lie in a file. */
const READ = `
import csv, io, json, sys
rows = csv.reader(io.TextIOWrapper(sys.stdin.buffer, encoding="utf-8-sig", newline=""), strict=True)
print(json.dumps(list(rows)))`

const table = (head: readonly string[], rows: readonly (readonly Cell[])[]): Promise<string> =>
  text(csvStream(head, Readable.from(rows)))

const asRead = (cell: Cell): string => {
  if (cell === null) return ''
  return typeof cell === 'number' ? String(cell) : harmless(cell)
}

describe('a cell of text', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\0=1', '=cmd|x', '＝1', '＋1', '－1', '＠A1', '-0.3'])(
    '%j is shown, not computed',
    (sent) => {
      expect(harmless(sent)).toBe(`'${sent}`)
    },
  )

  it.each(['', 'plain', '1+1', ' =1', 'a@b', "'quoted'", '5 - 3', 'Ω ≤ 0.42'])('%j stays as it is', (sent) => {
    expect(harmless(sent)).toBe(sent)
  })
})

describe('a cell that is a number', () => {
  it.each([
    [-0.3, '-0.3'],
    [0, '0'],
    [1e21, '1e+21'],
    [0.1 + 0.2, '0.30000000000000004'],
  ] as const)('%d is written as %s', (number, written) => {
    expect(csvRow([number])).toBe(`${written}\r\n`)
  })

  it.each([Number.NaN, Infinity, -Infinity])('%d is refused', (number) => {
    expect(() => csvRow([number])).toThrow('no number')
  })
})

describe('a table', () => {
  it('quotes what must be quoted, ends lines as the format says, and begins with the mark of UTF-8', async () => {
    expect(
      await table(
        ['number', 'place'],
        [
          ['FEN-2026-0001', 'Alder Mill, "old"'],
          [null, 'two\nlines'],
        ],
      ),
    ).toBe('\uFEFFnumber,place\r\nFEN-2026-0001,"Alder Mill, ""old"""\r\n,"two\nlines"\r\n')
  })

  it('refuses a row that has not as many cells as the head', async () => {
    await expect(table(['a', 'b'], [['1', '2', '3']])).rejects.toThrow('3 cells instead of 2')
  })

  it("is read back cell by cell by another language's reader", async () => {
    const sign = fc.constantFrom('=', '+', '-', '@', '\t', '\r', '\n', '"', ',', "'", ';', ' ', 'a', 'Ω', '\uFEFF')
    const any = fc.oneof(fc.string({ unit: 'grapheme' }), fc.string({ unit: sign, maxLength: 8 }))
    const number = fc.oneof(fc.integer(), fc.double({ noNaN: true, noDefaultInfinity: true }))
    const cell: fc.Arbitrary<Cell> = fc.oneof(any, number, fc.constant(null))
    const wide = fc
      .integer({ min: 1, max: 5 })
      .chain((width) =>
        fc.array(fc.array(cell, { minLength: width, maxLength: width }), { minLength: 1, maxLength: 8 }),
      )
    await fc.assert(
      fc.asyncProperty(wide, async (rows) => {
        const head = (rows[0] ?? []).map((_, index) => `column ${index}`)
        const read = python(READ, await table(head, rows))
        expect(read).toEqual([head, ...rows.map((row) => row.map(asRead))])
      }),
      { numRuns: 30 },
    )
  })

  it('gives every text that a spreadsheet would compute a mark, whatever stands in it', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (sent) => {
        expect(harmless(sent)).not.toMatch(/^[=+\-@\t\r\0]/)
        expect(csvRow([sent])).not.toMatch(/^"?[=+\-@\t\r\0]/)
      }),
    )
  })

  it('asks for rows no faster than they are read, and for none when the reader leaves', async () => {
    let asked = 0
    let closed = false
    async function* rows(): AsyncGenerator<readonly Cell[]> {
      try {
        for (;;) {
          asked += 1
          yield [`row ${asked}`, asked]
        }
      } finally {
        closed = true
      }
    }
    const stream = csvStream(['name', 'number'], rows())
    for await (const chunk of stream) {
      expect(String(chunk)).toContain('name,number')
      break
    }
    expect(asked).toBeLessThan(20_000)
    await wait(10)
    expect(closed).toBe(true)
  })
})
