import type { Values } from './calculator'
import { readSnow, type SnowCover } from './snowCover'
import { optionalNumber } from './values'

/** The snow on the lid, undefined where none was said. */
export const readLidSnow = (values: Values): SnowCover | undefined =>
  readSnow(
    {
      groundSnowLoad: optionalNumber(values, 'groundSnowLoad'),
      depth: optionalNumber(values, 'snowDepth'),
      density: optionalNumber(values, 'snowDensity'),
    },
    { depth: 'snowDepth', density: 'snowDensity' },
  )
