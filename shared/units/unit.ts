import type { Quantity } from '../calculators/calculator'
import type { UnitSystem } from '../contracts/exercises'

/** A unit: how many SI units one of it is, every way to write it, and how many decimals it is shown with. */
export interface Unit {
  /** The way it is written in the interface. */
  name: string
  factor: number
  /** Other ways to write it, in lower case. */
  aliases: string[]
  /** Decimals shown, for a number of this size in this unit. */
  decimals: (size: number) => number
  /** Written against the number, as in 18.43°. */
  closeUp?: boolean
}

const INCH = 0.0254
const FOOT = 12 * INCH
const YARD = 36 * INCH
const POUND = 0.45359237
/** US liquid gallon: 231 cubic inches. */
const GALLON = 231 * INCH ** 3
const POUND_FORCE = POUND * 9.80665

const whole = () => 0
const two = () => 2
const three = () => 3
const four = () => 4
/** About three figures: 2.84, 11.6, 315. */
const threeFigures = (size: number) => (size < 10 ? 2 : size < 100 ? 1 : 0)

const unit = (
  name: string,
  factor: number,
  aliases: string,
  decimals: Unit['decimals'],
  closeUp = false,
): Unit => ({
  name,
  factor,
  aliases: aliases === '' ? [] : aliases.split(','),
  decimals,
  closeUp,
})

const slopes = [
  unit('', 1, '', four),
  unit('%', 0.01, 'percent,per cent', two),
  unit('mm/m', 0.001, 'mm per m', (size) => (size < 10 ? 1 : 0)),
  unit('in/ft', 1 / 12, 'in per ft', three),
]

/** Every unit of every quantity; the factor gives SI (radians for angles). */
export const units: Record<Quantity, Unit[]> = {
  length: [
    unit('mm', 0.001, 'millimetre,millimetres,millimeter,millimeters', (size) =>
      size < 9.95 ? 1 : 0,
    ),
    unit('cm', 0.01, 'centimetre,centimetres,centimeter,centimeters', (size) => (size < 1 ? 2 : 1)),
    unit('m', 1, 'metre,metres,meter,meters', three),
    unit('in', INCH, 'inch,inches,"', three),
    unit('ft', FOOT, "foot,feet,'", three),
    unit('yd', YARD, 'yard,yards', three),
  ],
  area: [
    unit('m²', 1, 'm2,m^2,sq m', two),
    unit('mm²', 1e-6, 'mm2,mm^2,sq mm', whole),
    unit('cm²', 1e-4, 'cm2,cm^2,sq cm', whole),
    unit('ft²', FOOT ** 2, 'ft2,ft^2,sq ft', two),
    unit('in²', INCH ** 2, 'in2,in^2,sq in', two),
    unit('yd²', YARD ** 2, 'yd2,yd^2,sq yd', two),
  ],
  volume: [
    unit('m³', 1, 'm3,m^3,cu m', three),
    unit('L', 0.001, 'litre,litres,liter,liters', threeFigures),
    unit('ml', 1e-6, 'millilitre,millilitres,milliliter,milliliters', whole),
    unit('cm³', 1e-6, 'cm3,cm^3,cc', whole),
    unit('yd³', YARD ** 3, 'yd3,yd^3,cu yd,cubic yd,cubic yard,cubic yards', three),
    unit('ft³', FOOT ** 3, 'ft3,ft^3,cu ft,cubic ft,cubic foot,cubic feet', three),
    unit('in³', INCH ** 3, 'in3,in^3,cu in', two),
    unit('gal', GALLON, 'gallon,gallons', threeFigures),
    unit('qt', GALLON / 4, 'qts,quart,quarts', threeFigures),
    unit('pt', GALLON / 8, 'pts,pint,pints', threeFigures),
  ],
  angle: [
    unit('°', Math.PI / 180, 'deg,degree,degrees', two, true),
    unit('rad', 1, 'radian,radians', four),
  ],
  ratio: slopes,
  risePer12: [unit('in 12', 1, '/12,: 12,:12', two)],
  percent: [unit('%', 1, 'percent,per cent', two)],
  mass: [
    unit('kg', 1, 'kilogram,kilograms,kilo,kilos', threeFigures),
    unit('g', 0.001, 'gram,grams', whole),
    unit('t', 1000, 'tonne,tonnes', three),
    unit('lb', POUND, 'lbs,pound,pounds', threeFigures),
    unit('oz', POUND / 16, 'ounce,ounces', two),
  ],
  massDensity: [
    unit('kg/m³', 1, 'kg/m3,kg/m^3', whole),
    unit('kg/L', 1000, 'kg/l,g/cm3,g/cm³', three),
    unit('lb/ft³', POUND / FOOT ** 3, 'lb/ft3,lb/ft^3,pcf', two),
    unit('lb/yd³', POUND / YARD ** 3, 'lb/yd3,lb/yd^3', whole),
  ],
  pressure: [
    unit('kPa', 1000, '', two),
    unit('Pa', 1, '', whole),
    unit('MPa', 1e6, 'n/mm2,n/mm²', two),
    unit('psf', POUND_FORCE / FOOT ** 2, 'lb/ft2,lb/ft²', two),
    unit('psi', POUND_FORCE / INCH ** 2, 'lb/in2,lb/in²', whole),
  ],
  force: [
    unit('N', 1, 'newton,newtons', threeFigures),
    unit('kN', 1000, '', three),
    unit('lbf', POUND_FORCE, 'lb,lbs', threeFigures),
    unit('kgf', 9.80665, '', threeFigures),
  ],
  count: [unit('', 1, 'bag,bags,piece,pieces,board,boards,sheet,sheets', two)],
  money: [unit('', 100, '', two)],
  time: [
    unit('min', 60, 'minute,minutes', two),
    unit('s', 1, 'sec,second,seconds', whole),
    unit('h', 3600, 'hr,hrs,hour,hours', three),
    unit('d', 86400, 'day,days', three),
  ],
}

const siteUnits: Record<Quantity, [metric: string, imperial: string]> = {
  length: ['mm', 'in'],
  area: ['m²', 'ft²'],
  volume: ['m³', 'yd³'],
  angle: ['°', '°'],
  ratio: ['', ''],
  risePer12: ['in 12', 'in 12'],
  percent: ['%', '%'],
  mass: ['kg', 'lb'],
  massDensity: ['kg/m³', 'lb/ft³'],
  pressure: ['kPa', 'psf'],
  force: ['N', 'lbf'],
  count: ['', ''],
  money: ['', ''],
  time: ['min', 'min'],
}

/** The unit a bare number takes on site in this system: mm or in for lengths. */
export const siteUnit = (quantity: Quantity, system: UnitSystem): string =>
  siteUnits[quantity][system === 'metric' ? 0 : 1]

/** The unit of this quantity written so, in any of its spellings; undefined where there is none. */
export function findUnit(quantity: Quantity, written: string): Unit | undefined {
  const lower = written.trim().toLowerCase()
  return units[quantity].find(
    (candidate) => candidate.name.toLowerCase() === lower || candidate.aliases.includes(lower),
  )
}

/** However it is asked for, a slope can be said in each of these; `:` is rise over run, 1:48 or 4/12. */
const slopeForms = ['°', '%', ':', 'mm/m', 'in/ft']
const slopeQuantities: Quantity[] = ['angle', 'ratio', 'risePer12']

/** The units a value of this quantity can be written in, by the names the parser gives them. */
export function unitNames(quantity: Quantity): string[] {
  if (slopeQuantities.includes(quantity)) return slopeForms
  return units[quantity].map(({ name }) => name).filter(Boolean)
}

/** The quantities that have a unit written so, to tell a person what a wrong unit measures. */
export function quantitiesOfUnit(written: string): Quantity[] {
  if (written.trim() === '') return []
  return (Object.keys(units) as Quantity[]).filter((quantity) => findUnit(quantity, written))
}

/** Units of one system with the unit a person of the other thinks in. */
const counterparts: Record<UnitSystem, Record<string, string>> = {
  metric: {
    mm: 'in',
    cm: 'in',
    m: 'ft',
    'm²': 'ft²',
    'mm²': 'in²',
    'cm²': 'in²',
    'm³': 'yd³',
    L: 'qt',
    ml: 'in³',
    'cm³': 'in³',
    kg: 'lb',
    g: 'oz',
    t: 'lb',
    'kg/m³': 'lb/ft³',
    'kg/L': 'lb/ft³',
    kPa: 'psf',
    Pa: 'psf',
    MPa: 'psi',
    N: 'lbf',
    kN: 'lbf',
    kgf: 'lbf',
    'mm/m': 'in/ft',
  },
  imperial: {
    in: 'mm',
    ft: 'm',
    'ft in': 'mm',
    yd: 'm',
    'ft²': 'm²',
    'in²': 'cm²',
    'yd²': 'm²',
    'yd³': 'm³',
    'ft³': 'm³',
    'in³': 'cm³',
    gal: 'L',
    qt: 'L',
    pt: 'L',
    lb: 'kg',
    oz: 'g',
    'lb/ft³': 'kg/m³',
    'lb/yd³': 'kg/m³',
    psf: 'kPa',
    psi: 'MPa',
    lbf: 'N',
    'in/ft': 'mm/m',
  },
}

/** The unit itself where it belongs to the system or to both, else the one a person of that system thinks in. */
export const unitIn = (name: string, system: UnitSystem): string =>
  counterparts[system === 'metric' ? 'imperial' : 'metric'][name] ?? name
