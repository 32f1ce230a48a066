import type { LayerState } from './marks'

/** The stages of a build in the order they are built. */
export const STAGES = ['ground', 'base', 'frame', 'cladding', 'roof', 'finish'] as const
export type Stage = (typeof STAGES)[number]

/** How far each stage has come; a stage that is left out is still in pencil. */
export type StageStates = Partial<Record<Stage, LayerState>>

/** A number that ties a part of the drawing to its row in the schedule. */
export interface CourseBubble {
  stage: Stage
  number: number
  /** Left out where the drawing is nobody's build yet. */
  state?: 'to-do' | 'here' | 'done'
}

const STATE_WORDS: Record<LayerState, string> = {
  pencil: 'in pencil',
  ink: 'inked',
  signed: 'signed off',
}

const STAGE_WORDS: Record<Stage, string> = {
  ground: 'Ground',
  base: 'Base',
  frame: 'Frame',
  cladding: 'Cladding',
  roof: 'Roof',
  finish: 'Finish',
}

const BUBBLE_CLASSES = { 'to-do': 'b-todo', here: 'b-here', done: 'b-done' } as const

/** The state of every stage, pencil where none is given. */
export function fillStageStates(states: StageStates): Record<Stage, LayerState> {
  const filled = {} as Record<Stage, LayerState>
  for (const stage of STAGES) filled[stage] = states[stage] ?? 'pencil'
  return filled
}

/** Every stage in the same state, as for a sheet in the register. */
export function allStages(state: LayerState): Record<Stage, LayerState> {
  return fillStageStates(Object.fromEntries(STAGES.map((stage) => [stage, state])))
}

/** The class that colours a bubble by its state. */
export function bubbleClass(bubble: CourseBubble): string {
  return bubble.state ? BUBBLE_CLASSES[bubble.state] : ''
}

/** Says in words how far a build has come, for those who cannot see the drawing. */
export function describeStages(
  subject: string,
  states: StageStates,
  bubbles: readonly CourseBubble[] = [],
): string {
  const filled = fillStageStates(states)
  const parts = STAGES.map((stage) => {
    const bubble = bubbles.find((candidate) => candidate.stage === stage)
    const number = bubble ? `${bubble.number} ` : ''
    const here = bubble?.state === 'here' ? ', you are here' : ''
    return `${number}${STAGE_WORDS[stage]}: ${STATE_WORDS[filled[stage]]}${here}.`
  })
  return [`${subject}.`, ...parts].join(' ')
}
