import { Router } from 'express'

export const benchLessonsRouter = Router()
