import { z } from 'zod'

/** How a person likes to read lengths, areas, volumes and masses. */
export const unitSystemSchema = z.enum(['metric', 'imperial'])
export type UnitSystem = z.infer<typeof unitSystemSchema>
