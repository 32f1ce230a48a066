import { Router } from 'express'

export const progressRouter = Router()
