import type { Caution } from '../calculators/calculator'

/** What is said before a cut list is read. */
export const cutListCautions: Caution[] = [
  {
    title: 'At the saw',
    text: 'Clamp the piece and support both ends, so that the cut does not close on the blade. Eye and ear protection. Let the blade stop before you reach for piece or offcut; never hold a short piece by hand.',
  },
  {
    title: 'Dust and treated wood',
    text: 'Cut outdoors with a mask rated for fine dust. Wear gloves with treated wood, coat its cut ends as its label says, and never burn its offcuts.',
  },
  {
    title: 'Look at each end first',
    text: 'Ends are often split or out of square. Trim them until the wood is sound, and set the end trim to what you really take off; mark, cut and measure one piece before you cut the rest.',
  },
  {
    title: 'Lengths, not strength',
    text: 'The list knows nothing of loads. Which section carries what follows your local code; ask the building department and, where it is required, a licensed engineer.',
  },
]
