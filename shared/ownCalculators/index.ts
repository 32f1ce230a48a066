export { buildOwnCalculator } from './build'
export { checkOwnCalculator } from './check'
export { describeOwnCalculator, type CalculatorFace } from './face'
