import type { Step } from '../../kit/lesson'

export const steps: Step[] = [
  {
    id: 'caution',
    title: 'Before you open a bag',
    before: 2.7,
    after: 0.2,
    lines: [
      {
        id: 'burns',
        say: 'Before you open a bag: wet cement burns skin without hurting at first.',
        cap: 'Before you open a bag: wet cement\nburns skin without hurting at first.',
      },
      {
        id: 'gloves',
        say: 'Wear long waterproof gloves and eye protection.',
        cap: 'Wear long waterproof gloves\nand eye protection.',
      },
      {
        id: 'mask',
        say: 'Wear a mask rated for fine dust until the last bag is wet.',
        cap: 'Wear a mask rated for fine dust\nuntil the last bag is wet.',
      },
      {
        id: 'rinse',
        say: 'Rinse splashes at once; in an eye, for twenty minutes, and get medical help.',
        cap: 'Rinse splashes at once; in an eye,\nfor 20 minutes, and get medical help.',
      },
    ],
  },
  {
    id: 'bags',
    title: 'How many bags',
    before: 0.4,
    lines: [
      {
        id: 'pad',
        say: 'My pad is twenty six hundred by eleven hundred, one hundred thick.',
        cap: 'My pad is 2600 by 1100, 100 thick.',
      },
      {
        id: 'yield',
        say: 'One bag makes eleven and a half litres: read your own.',
        cap: 'One bag makes 11.5 litres:\nread your own.',
      },
      {
        id: 'ask-bags',
        say: 'With ten percent for waste, how many bags do I buy?',
        cap: 'With 10 % for waste,\nhow many bags do I buy?',
        stop: { key: 'bags', name: 'Bags' },
      },
      {
        id: 'answer',
        say: 'Twenty seven and a bit, so I buy twenty eight.',
        cap: '27 and a bit, so I buy 28.',
        after: 0.9,
      },
    ],
  },
  {
    id: 'water',
    title: 'Water, a little at a time',
    before: 0.3,
    lines: [
      {
        id: 'least',
        say: 'Start with the least water the bag allows, then add a little at a time.',
        cap: 'Start with the least water the bag\nallows, then add a little at a time.',
      },
      {
        id: 'weak',
        say: 'Too much water makes weak concrete, and you cannot take it out.',
        cap: 'Too much water makes weak concrete,\nand you cannot take it out.',
      },
    ],
  },
  {
    id: 'furrow',
    title: 'Look at the furrow',
    before: 0.3,
    lines: [
      {
        id: 'trowel',
        say: 'Pull a trowel through once and look at the furrow.',
        cap: 'Pull a trowel through once\nand look at the furrow.',
      },
      {
        id: 'ask-mix',
        say: 'Which of these would you pour?',
        cap: 'Which of these would you pour?',
        stop: { key: 'the-mix', name: 'The mix' },
      },
      {
        id: 'right',
        say: 'C, where the furrow stands and the top closes.',
        cap: 'C, where the furrow stands\nand the top closes.',
      },
      {
        id: 'others',
        say: 'If it falls in, it is too dry; if water shows, it is too wet.',
        cap: 'If it falls in, it is too dry;\nif water shows, it is too wet.',
      },
    ],
  },
  {
    id: 'pour',
    title: 'Pour and strike off',
    before: 0.3,
    after: 1.6,
    lines: [
      {
        id: 'tip',
        say: 'Wet the stone, tip from the far corner and work back.',
        cap: 'Wet the stone, tip from the far\ncorner and work back.',
        after: 0.8,
      },
      {
        id: 'strike',
        say: 'Lay the board along the fall, and strike off with a sawing motion.',
        cap: 'Lay the board along the fall,\nand strike off with a sawing motion.',
        after: 0.7,
      },
      {
        id: 'code',
        say: 'Local code, and the words on your bag, come before mine.',
        cap: 'Local code, and the words\non your bag, come before mine.',
      },
    ],
  },
]
