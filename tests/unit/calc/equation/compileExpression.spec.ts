import { describe, expect, it } from 'vitest'
import { compileExpression } from '#server/utils/calc/equation/compileExpression'
import { CalcInputError } from '#server/utils/calc/calcInputError'

describe('compileExpression', () => {
  it('gives the value of what the closed set allows', () => {
    expect(compileExpression('70 * M ^ 0.75').valueOf({ M: 1 })).toBe(70)
    expect(compileExpression('(1 + x) / 4 - -x').valueOf({ x: 3 })).toBe(4)
    expect(compileExpression('exp(0) + log10(1000) + sqrt(16)').valueOf({})).toBeCloseTo(8, 12)
  })

  it('keeps the order of powers and signs that mathematics has', () => {
    expect(compileExpression('2 ^ 3 ^ 2').valueOf({})).toBe(512)
    expect(compileExpression('-2 ^ 2').valueOf({})).toBe(-4)
    expect(compileExpression('2 ^ -1').valueOf({})).toBe(0.5)
    expect(compileExpression('8 / 4 / 2').valueOf({})).toBe(1)
    expect(compileExpression('2 + 3 * 4').valueOf({})).toBe(14)
  })

  it('names what it needs, each once, and parses the same text once', () => {
    expect(compileExpression('a * L ^ b + a').symbols).toEqual(['a', 'L', 'b'])
    expect(compileExpression('a * L ^ b + a')).toBe(compileExpression('a * L ^ b + a'))
  })

  it('is written with names and with values, published numbers unchanged', () => {
    const compiled = compileExpression('0.013 * g ^ 0.8 * 10 ^ (0.038 * T) - x / 2')
    expect(compiled.written).toBe('0.013 × g^0.8 × 10^(0.038 × T) − x ÷ 2')
    expect(compiled.filledIn({ g: 10, T: 30, x: 1 }, String)).toBe('0.013 × 10^0.8 × 10^(0.038 × 30) − 1 ÷ 2')
    expect(compileExpression('723.6756 * L').filledIn({ L: 1 }, value => value.toFixed(0))).toBe('723.6756 × 1')
    expect(compileExpression('10 ^ (-1.461 + log10(g))').written).toBe('10^(−1.461 + log10(g))')
  })

  it.each([
    'sin(x)', 'import("x")', 'x = 3', 'x; 2', '[1, 2]', '"text"', 'x > 2', 'x!', 'f(x) = x', 'x.y', '2 kg', '2 x', 'x % 2', 'log10(1, 2)', 'true ? 1 : 2', '{a: 1}', 'x[1]', '+x', 'true', 'null', '', '3 +',
  ])('refuses %s', (text) => {
    expect(() => compileExpression(text)).toThrow(CalcInputError)
    expect(() => compileExpression(text)).toThrow(expect.objectContaining({ code: 'equation.expression' }))
  })
})
