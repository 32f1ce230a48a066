import type { CoverDrawing, HazardKind, StageKind } from '../../../shared/contracts/courses'

/** The stages of a build in order, with their usual names. */
export const stageChoices: { value: StageKind; label: string }[] = [
  { value: 'ground', label: 'Ground' },
  { value: 'base', label: 'Base' },
  { value: 'frame', label: 'Frame' },
  { value: 'cladding', label: 'Cladding' },
  { value: 'roof', label: 'Roof' },
  { value: 'finish', label: 'Finish' },
]

export const coverChoices: { value: CoverDrawing; label: string }[] = [
  { value: 'log-store', label: 'A store with a sloping roof' },
  { value: 'deck', label: 'A deck at ground level' },
  { value: 'picket-fence', label: 'A fence with a gate' },
]

export const hazardChoices: { value: HazardKind; label: string }[] = [
  { value: 'cement', label: 'Wet cement' },
  { value: 'lift', label: 'Lifting' },
  { value: 'saw', label: 'Blades' },
  { value: 'dust', label: 'Dust or vapour' },
  { value: 'dig', label: 'Digging, buried services' },
  { value: 'drop', label: 'A drop, or something that can fall' },
]
