import type { Step } from '../../kit/lesson'

export const steps: Step[] = [
  {
    id: 'opening',
    title: 'Why it must be square',
    before: 0.9,
    after: 0.3,
    lines: [
      {
        id: 'why',
        say: 'A square form saves you trouble all the way up to the roof.',
        cap: 'A square form saves you trouble\nall the way up to the roof.',
      },
    ],
  },
  {
    id: 'caution',
    title: 'Before you start',
    before: 0.5,
    after: 0.3,
    lines: [
      {
        id: 'buried',
        say: 'First: know what is buried here before you drive a peg.',
        cap: 'First: know what is buried here\nbefore you drive a peg.',
      },
      {
        id: 'eyes',
        say: 'Wear eye protection when you hammer.',
        cap: 'Wear eye protection when you hammer.',
      },
    ],
  },
  {
    id: 'marks',
    title: 'Three and four',
    before: 0.5,
    lines: [
      {
        id: 'inside',
        say: 'Measure from the inside faces, because the concrete touches those.',
        cap: 'Measure from the inside faces,\nbecause the concrete touches those.',
      },
      {
        id: 'short',
        say: 'From the corner, mark nine hundred on the short board.',
        cap: 'From the corner, mark 900\non the short board.',
      },
      {
        id: 'long',
        say: 'Mark twelve hundred on the long board.',
        cap: 'Mark 1200 on the long board.',
      },
      {
        id: 'crow',
        say: "Draw a crow's foot each time: its point is the mark.",
        cap: 'Draw a crow’s foot each time:\nits point is the mark.',
      },
      {
        id: 'ask-tape',
        say: 'Now, before I pull the tape across, what should it read?',
        cap: 'Now, before I pull the tape across,\nwhat should it read?',
        stop: { key: 'three-four-five', name: '3-4-5' },
      },
    ],
  },
  {
    id: 'tape',
    title: 'What the tape reads',
    after: 0.5,
    lines: [
      {
        id: 'five',
        say: 'Five times three hundred is fifteen hundred.',
        cap: '5 × 300 is 1500.',
      },
      {
        id: 'open',
        say: 'Mine reads fifteen hundred and six, so the corner is open.',
        cap: 'Mine reads 1506,\nso the corner is open.',
      },
      {
        id: 'tap',
        say: 'I tap the peg, not the corner, until the tape reads fifteen hundred.',
        cap: 'I tap the peg, not the corner,\nuntil the tape reads 1500.',
        after: 1,
      },
    ],
  },
  {
    id: 'diagonals',
    title: 'Both diagonals',
    before: 0.4,
    after: 1.6,
    lines: [
      {
        id: 'one',
        say: 'One square corner does not make a square form.',
        cap: 'One square corner does not make\na square form.',
      },
      {
        id: 'both',
        say: 'So measure both diagonals, inside corner to inside corner.',
        cap: 'So measure both diagonals,\ninside corner to inside corner.',
      },
      {
        id: 'ask-both',
        say: 'For twenty six hundred by eleven hundred, what must both read?',
        cap: 'For 2600 by 1100,\nwhat must both diagonals read?',
        stop: { key: 'both-diagonals', name: 'Both diagonals' },
      },
      {
        id: 'answer',
        say: 'Twenty eight twenty three, and the other one the same.',
        cap: '2823, and the other one the same.',
      },
      {
        id: 'rack',
        say: 'If they differ, push in the ends of the longer one.',
        cap: 'If they differ,\npush in the ends of the longer one.',
        after: 0.9,
      },
      {
        id: 'fix',
        say: 'When they agree, fix the pegs and measure once more.',
        cap: 'When they agree, fix the pegs\nand measure once more.',
      },
    ],
  },
]
