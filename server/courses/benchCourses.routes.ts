import { Router } from 'express'

export const benchCoursesRouter = Router()
