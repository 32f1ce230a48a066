import type { Caution, Source } from './calculator'

/** What stands before the numbers of `batch`. */
export const batchCautions: Caution[] = [
  {
    title: 'Wet cement burns, and its dust harms lungs',
    text: 'Waterproof gloves, long sleeves, boots and eye protection. Rinse splashes at once with clean water. Open and tip bags out of the wind, with a respirator rated for silica.',
  },
  {
    title: 'The strength is a guess, never a promise',
    text: 'It comes from laboratory mixes, cured wet for 28 days. Boxes by eye, wet sand and a dry week take a third of it and more. Where a figure is asked for, buy ready-mixed concrete with a delivery note.',
  },
  {
    title: 'A mixer turns',
    text: 'No loose sleeves, no shovel in a turning drum, the lead on a residual current device or ground-fault outlet.',
  },
  {
    title: 'Not for what carries people',
    text: 'Footings, anything with steel in it and anything people stand on or under follow the local code and, where it is required, a licensed engineer.',
  },
]

/** Where the figures of `batch` come from. */
export const batchSources: Source[] = [
  {
    title: 'ACI 211.1-91, Table 6.3.3, as reproduced in course notes and an open-access paper',
    detail: 'mixing water and air; air-entrained for moderate exposure',
    kind: 'published',
  },
  {
    title:
      'ACI 211.1, water-cement ratio and strength, metric version, as reproduced in course notes',
    detail: 'straight between its rows',
    kind: 'published',
  },
  {
    title: 'The row 15 MPa without air, water to cement 0.79',
    detail: 'the copy that was read leaves it out',
    kind: 'from memory',
  },
  {
    title: 'Rule of two thirds for mixing by hand',
    detail: '1.5 of loose cement, sand and stone make 1 of concrete; older handbooks go up to 1.65',
    kind: 'published',
  },
  {
    title: 'Quantity notes for 1:2:4',
    detail: 'a bag of 50 kg of cement is 1/30 m³: 1500 kg/m³',
    kind: 'published',
  },
]
