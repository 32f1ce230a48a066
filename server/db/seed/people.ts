/** One person of the demo. */
interface PersonSeed {
  email: string
  displayName: string
  role: 'learner' | 'instructor' | 'admin'
  units: 'metric' | 'imperial'
  theme: 'paper' | 'sun'
  about: string
  joinedOn: string
  passphrase: string
}

/**
 * Passphrases of the demo, printed at every start and known to everyone: they protect nothing.
 * People of one kind share theirs.
 */
const passphrases = {
  instructor: 'measure twice and pour once',
  helper: 'string line and a sharp pencil',
  admin: 'kettle on in the site office',
  learner: 'first shovel in the ground',
}

/** Everyone in the demo; invented, with addresses that lead nowhere. */
export const people = {
  maren: {
    email: 'maren@example.test',
    displayName: 'Maren Tolley',
    role: 'instructor',
    units: 'metric',
    theme: 'paper',
    about:
      'Has built outdoor stores, shelters and benches since 2009, and filmed these two in her own garden over one spring. Answers on most days before eight in the morning.',
    joinedOn: '2026-02-09T08:12:00Z',
    passphrase: passphrases.instructor,
  },
  wilf: {
    email: 'wilf@example.test',
    displayName: 'Wilf Haddow',
    role: 'instructor',
    units: 'imperial',
    theme: 'sun',
    about:
      'Fences, gates and the odd footbridge, thirty years of them. Rehangs other people’s gates for a living and would rather you hung yours once.',
    joinedOn: '2026-02-16T17:40:00Z',
    passphrase: passphrases.instructor,
  },
  sunil: {
    email: 'sunil@example.test',
    displayName: 'Sunil Perera',
    role: 'learner',
    units: 'metric',
    theme: 'paper',
    about: 'Built the log store from this sheet in a wet spring, twice if you count the first pad.',
    joinedOn: '2026-03-02T19:05:00Z',
    passphrase: passphrases.helper,
  },
  petra: {
    email: 'petra@example.test',
    displayName: 'Petra Novotná',
    role: 'learner',
    units: 'metric',
    theme: 'sun',
    about:
      'Site joiner before she taught woodwork at a school. Looks after the deck and the fence.',
    joinedOn: '2026-03-04T06:55:00Z',
    passphrase: passphrases.helper,
  },
  ruth: {
    email: 'ruth@example.test',
    displayName: 'Ruth Adeyemi',
    role: 'admin',
    units: 'metric',
    theme: 'paper',
    about: 'The office: accounts, reports and the kettle.',
    joinedOn: '2026-02-01T09:00:00Z',
    passphrase: passphrases.admin,
  },
  ines: {
    email: 'ines@example.test',
    displayName: 'Inês Carvalhal',
    role: 'learner',
    units: 'metric',
    theme: 'paper',
    about: '',
    joinedOn: '2026-10-18T20:31:00Z',
    passphrase: passphrases.learner,
  },
  jo: {
    email: 'jo@example.test',
    displayName: 'Jo Varga',
    role: 'learner',
    units: 'metric',
    theme: 'paper',
    about: 'Small garden, heavy clay, more firewood than shelter.',
    joinedOn: '2026-09-12T18:20:00Z',
    passphrase: passphrases.learner,
  },
  callum: {
    email: 'callum@example.test',
    displayName: 'Callum Reid',
    role: 'learner',
    units: 'imperial',
    theme: 'sun',
    about: 'Half an acre, one wheelbarrow, two children who want to help.',
    joinedOn: '2026-06-03T14:10:00Z',
    passphrase: passphrases.learner,
  },
  anke: {
    email: 'anke@example.test',
    displayName: 'Anke Dorsthorst',
    role: 'learner',
    units: 'metric',
    theme: 'paper',
    about: 'Sandy ground, a hedge on two sides. The store is full and the cat has moved in.',
    joinedOn: '2026-04-22T07:45:00Z',
    passphrase: passphrases.learner,
  },
  tomas: {
    email: 'tomas@example.test',
    displayName: 'Tomás Ferreyra',
    role: 'learner',
    units: 'metric',
    theme: 'sun',
    about: '',
    joinedOn: '2026-07-08T21:15:00Z',
    passphrase: passphrases.learner,
  },
  meilin: {
    email: 'meilin@example.test',
    displayName: 'Mei-Lin Ostrander',
    role: 'learner',
    units: 'imperial',
    theme: 'paper',
    about: 'Corner lot, a dog that jumps and a gate that sags. The gate goes first.',
    joinedOn: '2026-06-27T16:02:00Z',
    passphrase: passphrases.learner,
  },
  bram: {
    email: 'bram@example.test',
    displayName: 'Bram Kessel',
    role: 'learner',
    units: 'metric',
    theme: 'sun',
    about: 'Below sea level, so everything here is about water.',
    joinedOn: '2026-05-19T19:30:00Z',
    passphrase: passphrases.learner,
  },
  noor: {
    email: 'noor@example.test',
    displayName: 'Noor Haddadin',
    role: 'learner',
    units: 'imperial',
    theme: 'paper',
    about: '',
    joinedOn: '2026-08-14T05:50:00Z',
    passphrase: passphrases.learner,
  },
} satisfies Record<string, PersonSeed>

export type PersonKey = keyof typeof people

const signIn = (key: PersonKey, who: string) => ({
  email: people[key].email,
  passphrase: people[key].passphrase,
  who,
})

/** Demo sign-ins to show at the start; these passphrases are for trying things out and protect nothing. */
export const demoSignIns: { email: string; passphrase: string; who: string }[] = [
  signIn('maren', 'Maren Tolley, instructor: the log store and the deck'),
  signIn('wilf', 'Wilf Haddow, instructor: the fence, and a draft on the bench'),
  signIn('sunil', 'Sunil Perera, helper on the log store'),
  signIn('ines', 'Inês Carvalhal, learner: enrolled, nothing watched yet'),
  signIn('jo', 'Jo Varga, learner: under way, held at a stop of lesson 2'),
  signIn('callum', 'Callum Reid, learner: Ground and Base inked, feet and inches, bright sun'),
  signIn('anke', 'Anke Dorsthorst, learner: everything done'),
  signIn('ruth', 'Ruth Adeyemi, the office'),
]
