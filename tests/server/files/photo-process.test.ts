import { setTimeout as wait } from 'node:timers/promises'
import fc from 'fast-check'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gate } from '#server/files/gate.ts'
import type { PhotoAnswer, PhotoProblem } from '#server/files/photo-answer.ts'
import { packed, unpacked } from '#server/files/photo-frame.ts'
import { inOwnProcess } from '#server/files/photo-process.ts'
import { photoWords } from '#server/files/photo-words.ts'
import { type Built, builtProgram } from './photo-program.ts'

let built: Built
beforeAll(async () => {
  built = await builtProgram()
})
afterAll(() => built.remove())

const says = (script: string) => ({ args: ['-e', script] })
const BYTES = Buffer.alloc(5_000_000, 1)

describe('the process of a photo', () => {
  it('is ended when it takes too long', async () => {
    const start = performance.now()
    const endless = { ...says('for (;;) {}'), time: 300 }
    expect(await inOwnProcess(BYTES, endless)).toEqual({ ok: false, problem: { code: 'too-slow' } })
    expect(performance.now() - start).toBeLessThan(5_000)
  })

  it('is ended by the kernel when it works too long, also where nobody looks at the clock', async () => {
    const endless = { ...says('for (;;) {}'), time: 60_000, work: 1 }
    expect(await inOwnProcess(BYTES, endless)).toEqual({ ok: false, problem: { code: 'too-slow' } })
  })

  it('is ended when it takes more memory than allowed, on the heap or beside it', async () => {
    const onHeap = says('const all = []; for (;;) all.push(new Array(1e6).fill(all.length))')
    const beside = says('const all = []; for (;;) all.push(Buffer.alloc(10e6, 1))')
    for (const greedy of [onHeap, beside]) {
      const answer = await inOwnProcess(BYTES, greedy).catch((error: Error) => error.message)
      const ended =
        typeof answer === 'string'
          ? /memory|allocation/i.test(answer)
          : !answer.ok && answer.problem.code === 'too-heavy'
      expect(ended, JSON.stringify(answer)).toBe(true)
    }
  })

  it('reads a photo of many pixels as too heavy where memory is short, and the server goes on', async () => {
    const many = await sharp({ create: { width: 7_000, height: 5_000, channels: 3, background: 'teal' } })
      .jpeg({ progressive: true, chromaSubsampling: '4:4:4' })
      .toBuffer()
    const short = { ...built.program, memory: 262_144 }
    expect(await inOwnProcess(many, short)).toEqual({ ok: false, problem: { code: 'too-heavy' } })
    expect((await inOwnProcess(many, built.program)).ok).toBe(true)
  })

  it('knows nothing of the environment of the server', async () => {
    process.env['SKERRY_TEST_SECRET'] = 'planted'
    try {
      const telling = says('process.stderr.write(JSON.stringify(process.env)); process.exit(3)')
      const told = await inOwnProcess(BYTES, telling).catch((error: Error) => error.message)
      expect(told).toContain('ended with 3')
      expect(told).toContain('MALLOC_ARENA_MAX')
      expect(told).not.toContain('planted')
    } finally {
      delete process.env['SKERRY_TEST_SECRET']
    }
  })

  it.each([
    ['nothing', ''],
    ['no line', 'process.stdout.write("x")'],
    ['no object', 'process.stdout.write("[]\\n")'],
    ['a problem that does not exist', 'process.stdout.write(JSON.stringify({problem:{code:"__proto__"}})+"\\n")'],
    [
      'pictures that it does not send',
      'process.stdout.write(JSON.stringify({stored:{size:9,width:1,height:1}})+"\\n")',
    ],
  ])('is not believed when it says %s', async (_, script) => {
    await expect(inOwnProcess(BYTES, says(script))).rejects.toThrow('without an answer')
  })

  it('is ended when nobody waits for it any more', async () => {
    const leave = new AbortController()
    const answer = inOwnProcess(BYTES, says('setTimeout(() => {}, 60_000)'), leave.signal)
    await wait(200)
    leave.abort(new Error('the uploader left'))
    await expect(answer).rejects.toThrow('the uploader left')
    await expect(inOwnProcess(BYTES, says(''), leave.signal)).rejects.toThrow('the uploader left')
  })
})

describe('an answer on its way between the processes', () => {
  const jpeg = fc.uint8Array({ maxLength: 50 }).map((rest) => Buffer.from([0xff, 0xd8, ...rest]))
  const side = fc.integer({ min: 1, max: 1_600 })
  const picture = fc.record({ bytes: jpeg, width: side, height: side })
  const photo = fc.record({ stored: picture, paper: picture, taken: fc.constantFrom(null, '2026-05-04T10:15:30') })

  it('comes back as it was sent, and not at all when a byte is missing or too many', () => {
    fc.assert(
      fc.property(photo, (sent) => {
        const answer: PhotoAnswer = { ok: true, photo: sent }
        const bytes = packed(answer)
        expect(unpacked(bytes)).toEqual(answer)
        expect(unpacked(bytes.subarray(0, -1))).toBeUndefined()
        expect(unpacked(Buffer.concat([bytes, Buffer.from([0])]))).toBeUndefined()
      }),
    )
  })

  it('is a sentence for the uploader for every problem', () => {
    const problems: readonly PhotoProblem[] = [
      { code: 'empty' },
      { code: 'too-large', bytes: 20e6 },
      { code: 'not-a-photo', kind: 'PDF' },
      { code: 'not-readable-here', kind: 'HEIC' },
      { code: 'too-many-pixels', width: 9_000, height: 9_000 },
      { code: 'moving' },
      { code: 'damaged' },
      { code: 'too-heavy' },
      { code: 'too-slow' },
      { code: 'busy' },
    ]
    for (const problem of problems) {
      expect(unpacked(packed({ ok: false, problem }))).toEqual({ ok: false, problem })
      expect(photoWords(problem)).toMatch(/^[A-Z].*\.$/)
    }
    expect(photoWords({ code: 'too-large', bytes: 20e6 })).toContain('20.0 MB')
  })
})

describe('a gate', () => {
  it('lets two run, the rest wait in line, and turns away what the line cannot hold', async () => {
    const { run } = gate(2, 3)
    let running = 0
    let most = 0
    const order: number[] = []
    const work = (index: number) => async () => {
      running += 1
      most = Math.max(most, running)
      order.push(index)
      await wait(20)
      running -= 1
      if (index === 1) throw new Error('broken')
      return index
    }
    const all = await Promise.allSettled([0, 1, 2, 3, 4, 5, 6].map((index) => run(work(index))))
    expect(most).toBe(2)
    expect(order).toEqual([0, 1, 2, 3, 4])
    expect(all.map((one) => (one.status === 'rejected' ? 'broken' : (one.value?.result ?? 'turned away')))).toEqual([
      0,
      'broken',
      2,
      3,
      4,
      'turned away',
      'turned away',
    ])
    expect(await run(work(7))).toEqual({ result: 7 })
  })
})
