import type { CoverDrawing, Hazard, StageKind } from '../../../shared/contracts/courses'
import type { KitItem } from '../../../shared/contracts/lessons'
import type { Exercise, QuestionAnswer } from '../../../shared/contracts/exercises'
import type { OwnCalculatorDefinition } from '../../../shared/contracts/ownCalculators'
import type { Interval } from '../../../shared/contracts/progress'
import type { PersonKey } from './people'

/** A moment of a lesson's video: the stop its script was written for, or the end of its nth caption. */
export type MomentSeed = { stop: string } | { afterCue: number }

export interface StopSeed {
  key: string
  name: string
  at: MomentSeed
  /** Left out: the video waits. */
  byTheWay?: true
  exercise: Exercise | null
}

export interface LessonSeed {
  key: string
  title: string
  summary: string
  youWillWant: string
  hazards: Hazard[]
  isSample?: true
  /** Its video is still to be filmed. */
  withoutVideo?: true
  /** A video whose captions are still to be written. */
  withoutCaptions?: true
  kit: KitItem[]
  stops: StopSeed[]
}

export interface StageSeed {
  key: string
  kind: StageKind
  title: string
  lessons: LessonSeed[]
}

export interface HindsightSeed {
  lesson: string
  at: MomentSeed
  text: string
  by: PersonKey
  on: string
}

export interface AnswerSeed {
  by: PersonKey
  on: string
  markdown: string
  /** When its writer changed it. */
  editedOn?: string
}

export interface QuestionSeed {
  lesson: string
  /** Null when it is about the whole lesson. */
  at: MomentSeed | null
  by: PersonKey
  on: string
  title: string
  markdown: string
  answers: AnswerSeed[]
  /** Which answer settled it, counted from 0. */
  settled?: { answer: number; by: PersonKey; on: string }
}

export interface CourseSeed {
  slug: string
  sheetNumber: number
  owner: PersonKey
  helpers: PersonKey[]
  title: string
  outcome: string
  weekends: number
  tools: string[]
  hazards: Hazard[]
  coverDrawing: CoverDrawing
  facts: { label: string; value: string }[]
  notCovered: string
  changeNote: string
  createdOn: string
  /** Null while it is on the bench. */
  issuedOn: string | null
  stages: StageSeed[]
  /** Its own calculators by their keys, each kept as version 1. */
  ownCalculators?: Record<string, OwnCalculatorDefinition>
  hindsight: HindsightSeed[]
  questions: QuestionSeed[]
}

/** An answer that did not hold: the slip it makes, the text as typed, or the answers to a quiz. */
export type WrongSeed = { slip: string } | string | Record<string, QuestionAnswer>

export interface AnsweredStop {
  stop: string
  wrong?: WrongSeed[]
  solved: boolean
}

export interface WatchedLessonSeed {
  lesson: string
  /** When it was last watched. */
  on: string
  /** In ms; `whole` is all of the video. */
  watched: 'whole' | Interval[]
  /** `all`: each stop answered right at once. */
  stops: 'all' | AnsweredStop[]
  /** What its calculators gave was put in the field book. */
  inFieldBook?: true
}

export interface EnrolmentSeed {
  learner: PersonKey
  course: string
  buildName: string
  on: string
  lessons: WatchedLessonSeed[]
}
