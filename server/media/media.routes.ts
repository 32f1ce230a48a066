import { Router } from 'express'

export const mediaRouter = Router()
