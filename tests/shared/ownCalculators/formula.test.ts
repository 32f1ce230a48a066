import { describe, expect, it } from 'vitest'
import { readFormula } from '../../../shared/ownCalculators/formula'
import { FormulaError } from '../../../shared/ownCalculators/formulaError'
import { measureFormula } from '../../../shared/ownCalculators/measure'
import { quantityDimensions } from '../../../shared/ownCalculators/dimensions'

function refusalOf(expression: string): FormulaError | null {
  try {
    const { root } = readFormula(expression)
    measureFormula(root, (name, column, length) => {
      if (name === 'x') return quantityDimensions.count
      if (name === 'side') return quantityDimensions.length
      throw new FormulaError(column, length, `Nothing is called ${name}.`, '')
    })
    return null
  } catch (error) {
    if (error instanceof FormulaError) return error
    throw error
  }
}

/** Expression and the character it must be refused at. */
const hostile: [expression: string, column: number][] = [
  ['import("fs")', 8],
  ['import({a: 1})', 8],
  ['createUnit("foo")', 12],
  ['createUnit(x)', 1],
  ['evaluate("1+1")', 10],
  ['evaluate(x)', 1],
  ['parse(x)', 1],
  ['simplify(x)', 1],
  ['derivative(x, x)', 1],
  ['resolve(x)', 1],
  ['compile(x)', 1],
  ['help(x)', 1],
  ['config(x)', 1],
  ['typed(x)', 1],
  ['f(x) = x', 6],
  ['f(x) = f(x)', 6],
  ['x = 3', 3],
  ['x == 3; x = 4', 7],
  ['a.b = 3', 2],
  ['[1, 2, 3]', 1],
  ['ones(1e7)', 1],
  ['zeros(10000, 10000)', 1],
  ['identity(99999)', 1],
  ['range(1, 1e9)', 1],
  ['1:1000000', 2],
  ['x[1]', 2],
  ['{a: 1}', 1],
  ['{"constructor": x}.constructor', 1],
  ['"text"', 1],
  ["'text'", 1],
  ['concat("a", "b")', 8],
  ['cos.constructor', 4],
  ['cos.constructor("return process")()', 4],
  ['x.constructor', 2],
  ['constructor', 1],
  ['__proto__', 1],
  ['toString', 1],
  ['hasOwnProperty(x)', 1],
  ['process', 1],
  ['globalThis', 1],
  ['this', 1],
  ['x => x', 3],
  ['function(x)', 1],
  ['10!', 3],
  ['170! * 170!', 4],
  ['factorial(170)', 1],
  ['gamma(170)', 1],
  ['2 ^ 1e9', 3],
  ['9 ^ 9 ^ 9', 7],
  ['9 ^ (9 ^ 9)', 8],
  ['x ^ x', 3],
  ['side ^ 99', 6],
  ['1e308 * 10', 1],
  ['123456789012345678', 1],
  ['combinations(100, 50)', 1],
  ['primes(1e9)', 1],
  ['random()', 1],
  ['print("a")', 7],
  ['x # comment', 3],
  ['x\n= 3', 3],
  ['x to m', 3],
  ['x mod 2', 3],
  ['x and 1', 3],
  ['true', 1],
  ['null', 1],
  ['NaN', 1],
  ['Infinity', 1],
  ['i', 1],
  ['50 %', 4],
  ["x'", 2],
  ['x | 1', 3],
  ['~x', 1],
  ['x << 2', 4],
  ['1 < x < 3', 7],
  ['x ?? 1', 4],
  ['ширина * 2', 1],
  ['ｘ + 1', 1],
  ['x\u200b + 1', 2],
  ['`x`', 1],
  ['$x', 1],
  ['@x', 1],
  ['x\\y', 2],
  ['5 degC', 3],
  ['5 furlong', 3],
  ['5 coulomb', 3],
  ['sqrt', 1],
  ['sqrt()', 1],
  ['sqrt(1, 2)', 1],
  ['min(x)', 1],
  ['max(1, 2, 3, 4, 5, 6, 7, 8, 9)', 1],
  ['sin(x)(x)', 7],
  ['2 x', 3],
  ['x (x)', 1],
  ['x side', 3],
  ['+x', 1],
  ['1 > 0', 3],
  ['x ? 1 : 2', 3],
  ['x > 1 ? 2', 10],
  ['', 1],
  ['   ', 1],
  ['(', 2],
  [')', 1],
  ['x + ', 4],
  ['* x', 1],
  ['max(1,', 7],
  ['1,5', 2],
]

describe('readFormula and measureFormula on hostile or broken text', () => {
  it.each(hostile)('refuses %j at character %i', (expression, column) => {
    const refusal = refusalOf(expression)
    expect(refusal).toBeInstanceOf(FormulaError)
    expect(refusal?.column).toBe(column)
    expect(refusal?.message).toMatch(/^\S.*\.$/)
    expect(refusal?.length).toBeGreaterThan(0)
  })

  it.each([
    ['brackets', '('.repeat(150) + 'x' + ')'.repeat(149), 21],
    ['open brackets', '('.repeat(300), 21],
    ['closing brackets', ')'.repeat(300), 1],
    ['minus signs', '-'.repeat(299) + 'x', 151],
    ['functions in functions', 'abs('.repeat(60) + 'x' + ')'.repeat(59), 84],
    ['sums', Array.from({ length: 100 }, () => 'x').join('+'), 151],
    ['choices', 'x>1?1:'.repeat(49) + '1', 151],
    [
      'roots of powers',
      Array.from({ length: 40 }, () => 'x^2')
        .join('*')
        .slice(0, 300),
      151,
    ],
  ])(
    'refuses 300 characters of %s without running out of anything',
    (_what, expression, column) => {
      const before = performance.now()
      expect(refusalOf(expression)?.column).toBe(column)
      expect(performance.now() - before).toBeLessThan(1000)
    },
  )

  it('looks up nothing but what it lists: no name of an object is a function, a unit or a value', () => {
    for (const name of [...Object.getOwnPropertyNames(Object.prototype), 'prototype', 'name']) {
      expect([name, refusalOf(name)?.column, refusalOf(`${name}(x)`)?.column]).toEqual([name, 1, 1])
    }
  })
})

describe('readFormula on what a builder writes', () => {
  it.each([
    'x',
    'x * 2',
    '-x + 3.5',
    'x^2',
    'x ^ -1',
    'x^(1/3)',
    'x²',
    '2 × x ÷ 3 − 1',
    '3 m / (50 mm)',
    'side / (2 inch)',
    'side / (3 in)',
    'round(side / (50 mm)) + x',
    'x > 3 ? 1 : 2',
    'x ≥ 3 ? (x == 4 ? 1 : 0) : 2',
    'max(x, 1, 2) - min(x, 3)',
    'sin(30 deg) + cos(x) + tan(atan(x)) + sin(atan2(side, 2 m))',
    'hypot(3 m, 4 m) / side',
    'sqrt(side^2 / 1 m^2)',
    '1e3 * x + .5',
    'pi * x',
  ])('takes %j', (expression) => {
    expect(refusalOf(expression)).toBeNull()
  })

  it('keeps the place of every part, counted in what was typed', () => {
    const { root, tokens } = readFormula('x²  ×(side ÷ 2 in)')
    expect(tokens.map(({ text, column }) => [text, column])).toEqual([
      ['x', 1],
      ['^', 2],
      ['2', 2],
      ['*', 5],
      ['(', 6],
      ['side', 7],
      ['/', 12],
      ['2', 14],
      ['inch', 16],
      [')', 18],
    ])
    expect(root).toMatchObject({ kind: 'operation', sign: '*', column: 5 })
  })

  it('reads a number with its unit as one value before it divides', () => {
    const { root } = readFormula('x * 1600 kg/m^3')
    expect(root).toMatchObject({ sign: '/', left: { sign: '*' }, right: { sign: '^' } })
  })
})
