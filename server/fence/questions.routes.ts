import { Router } from 'express'

export const questionsRouter = Router()
