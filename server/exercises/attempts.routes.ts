import { Router } from 'express'

export const attemptsRouter = Router()
