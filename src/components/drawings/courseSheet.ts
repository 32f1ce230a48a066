import type { Drawing } from './drawing'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import type { CourseBubble, Stage, StageStates } from './stages'

/** Layout of a course drawing: the register's, a page's whole width, a phone's, or a small picture. */
export type CourseSheetSize = 'full' | 'wide' | 'narrow' | 'mini'

/** What every course drawing takes. */
export interface CourseDrawingProps {
  /** How far each stage has come; a stage that is left out is in pencil. */
  stageStates: StageStates
  /** Numbers that tie parts to the schedule of stages. */
  bubbles?: readonly CourseBubble[]
  /** `auto` picks the widest layout that the room allows. */
  size?: CourseSheetSize | 'auto'
  /** Units of the figures. */
  system?: UnitSystem
  /** Stage drawn in chalk because it is being worked on. */
  here?: Stage
  /** What the drawing shows, in place of the sheet's own name. */
  label?: string
  /** Set where the words beside the drawing say the same. */
  decorative?: boolean
}

export interface CourseSheetOptions {
  size: CourseSheetSize
  bubbles: readonly CourseBubble[]
  /** Writes a length given in millimetres as the reader's system has it. */
  figure: (mm: number) => string
}

/** A drawn course: the sheet, and what it is called in words. */
export interface CourseSheet {
  drawing: Drawing
  subject: string
}

export type DrawCourseSheet = (options: CourseSheetOptions) => CourseSheet

/** Height of the figures, in pixels on the screen. */
export const FIGURE = { wide: 13, narrow: 12 } as const
