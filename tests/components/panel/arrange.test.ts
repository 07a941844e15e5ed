import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { arrange, stack, type Placed } from '@/components/panel/arrange'
import type { Piece } from '@/components/panel/piece'

const anyPiece: fc.Arbitrary<Piece> = fc
  .record({ width: fc.integer({ min: 40, max: 500 }), height: fc.integer({ min: 60, max: 220 }), low: fc.boolean(), lineAfter: fc.boolean() })
  .map((piece) => ({ ...piece, drawing: null, targets: null }))

const apart = (a: Placed, b: Placed) =>
  a.x + a.piece.width <= b.x || b.x + b.piece.width <= a.x || a.y + a.piece.height <= b.y || b.y + b.piece.height <= a.y

describe('pieces on a case', () => {
  test('never overlap, keep inside the region when each fits, and stand in order', () => {
    fc.assert(
      fc.property(
        fc.array(anyPiece, { minLength: 1, maxLength: 9 }),
        fc.integer({ min: 500, max: 900 }),
        fc.constantFrom('start' as const, 'even' as const),
        (pieces, width, spread) => {
          const { placed, height } = arrange(pieces, { x: 20, y: 30, width, spread, widestGap: 66 })
          expect(placed.map(({ piece }) => piece)).toEqual(pieces)
          for (const [index, one] of placed.entries()) {
            expect(one.x).toBeGreaterThanOrEqual(19)
            expect(one.x + one.piece.width).toBeLessThanOrEqual(21 + width)
            expect(one.y + one.piece.height).toBeLessThanOrEqual(30 + height)
            for (const other of placed.slice(index + 1)) expect(apart(one, other)).toBe(true)
          }
        },
      ),
    )
  })

  test('low pieces share a column', () => {
    const low = (height: number): Piece => ({ width: 100, height, low: true, drawing: null, targets: null })
    const { placed } = arrange([low(80), low(70)], { x: 0, y: 0, width: 600, spread: 'start', widestGap: 66 })
    expect(placed.map(({ x, y }) => [x, y])).toEqual([[0, 0], [0, 104]])
  })
})

test('stacked pieces never overlap', () => {
  fc.assert(
    fc.property(fc.array(anyPiece, { minLength: 1, maxLength: 9 }), fc.boolean(), (pieces, beside) => {
      const { placed, height } = stack(pieces, 500, () => beside)
      for (const [index, one] of placed.entries()) {
        expect(one.y + one.piece.height).toBeLessThanOrEqual(height)
        for (const other of placed.slice(index + 1)) expect(apart(one, other)).toBe(true)
      }
    }),
  )
})
