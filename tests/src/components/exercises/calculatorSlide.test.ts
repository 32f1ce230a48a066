import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calculators, findCalculator, showInput } from '../../../../shared/calculators'
import { checkBounds } from '../../../../shared/calculators/readInputs'
import { slideAbout, slidingInputs } from '../../../../src/components/exercises/calculatorSlide'

function inputOf(id: string, name: string) {
  const input = slidingInputs(findCalculator(id)?.inputs ?? []).find((one) => one.name === name)
  if (!input) throw new Error(`No ${name}`)
  return input
}

describe('slideAbout', () => {
  it('goes from half to twice the number in round millimetres', () => {
    const slide = slideAbout(inputOf('slab', 'length'), 2.6, 'metric')
    expect([slide.min, slide.max, slide.step].map((metres) => Math.round(metres * 1000))).toEqual([
      1300, 5200, 20,
    ])
  })

  it('goes in sixteenths for who works in feet', () => {
    const slide = slideAbout(inputOf('slab', 'thickness'), 4 * 0.0254, 'imperial')
    expect(slide.step / 0.0254).toBe(1 / 16)
  })

  it('never leaves what the input takes, and always has room', () => {
    const systems = fc.constantFrom('metric' as const, 'imperial' as const)
    const inputs = calculators.flatMap((calculator) => slidingInputs(calculator.inputs))
    fc.assert(
      fc.property(
        fc.constantFrom(...inputs),
        systems,
        fc.double({ min: 0, max: 1, noNaN: true }),
        (input, system, share) => {
          const value = input.min + (input.max - input.min) * share
          const slide = slideAbout(input, value, system)
          expect(slide.step).toBeGreaterThan(0)
          expect(slide.max).toBeGreaterThanOrEqual(slide.min)
          for (const end of [slide.min, slide.max]) {
            const { ok } = checkBounds(input, end, system)
            expect(ok, `${input.name} ${showInput(input, end, system)}`).toBe(true)
          }
        },
      ),
    )
  })
})
