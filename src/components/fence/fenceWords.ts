import type { Question, Writer } from '../../../shared/contracts/fence'
import type { Person } from '../../../shared/contracts/socketEvents'
import { countOf, formatDay } from '../../../shared/units/moment'

const numbers = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine']

/** How long ago something was written: `just now`, `22 minutes ago`, `this morning 7:40`, `12 May`. */
export function timeAgo(iso: string, now = new Date()): string {
  const then = new Date(iso)
  const minutes = Math.floor((now.getTime() - then.getTime()) / 60_000)
  if (minutes < 1) return 'just now'
  if (minutes < 60) return `${countOf(minutes, 'minute')} ago`
  const time = then.toLocaleTimeString('en-GB', { hour: 'numeric', minute: '2-digit' })
  const dayBefore = new Date(now)
  dayBefore.setDate(now.getDate() - 1)
  if (then.toDateString() === now.toDateString()) return `today ${time}`
  if (then.toDateString() === dayBefore.toDateString()) return `yesterday ${time}`
  return formatDay(iso)
}

const places = { owner: ', who drew this sheet', helper: ', helper', learner: '' }

/** Who wrote, in words: `Maren, who drew this sheet`. */
export const writerWords = ({ name, place }: Writer) => `${name}${places[place]}`

/** A count of answers in words: `Two answers`. */
export function answersInWords(count: number): string {
  const number = numbers[count] ?? String(count)
  return count === 0 ? 'No answer yet' : `${number} ${count === 1 ? 'answer' : 'answers'}`
}

/** A question's state in words, and the tone it is said in. */
export function stateWords(question: Pick<Question, 'state' | 'answerCount'>): {
  words: string
  tone: 'ok' | 'bad' | ''
} {
  if (question.state === 'settled') return { words: 'Settled', tone: 'ok' }
  if (question.answerCount === 0) return { words: 'Open, no answer', tone: 'bad' }
  return { words: 'Answered, open', tone: '' }
}

const joinNames = (names: string[]) =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`

/** Who is at a lesson, in a sentence; `meId` is left out, `count` are all with me among them. */
export function presenceWords(here: Person[], count: number, meId: number | null): string {
  const others = here.filter((person) => person.id !== meId)
  const named = others.slice(0, 4).map((person) => person.name)
  const unnamed = count - (here.length - others.length) - named.length
  const visitors = meId === null ? unnamed - 1 : unnamed
  const names = visitors > 0 ? [...named, `${visitors} more`] : named
  if (!names.length) return ''
  const isOne = names.length === 1 && (visitors <= 0 || visitors === 1)
  return `${joinNames(names)} ${isOne ? 'is' : 'are'} at this lesson now.`
}

/** Who writes, in words: `Anke is writing`. */
export const writingWords = (people: Person[]) =>
  people.length
    ? `${joinNames(people.map((person) => person.name))} ${people.length === 1 ? 'is' : 'are'} writing`
    : ''
