import { Router } from 'express'

export const captionsRouter = Router()
