import { Router } from 'express'

export const lessonsRouter = Router()
