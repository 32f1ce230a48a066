import { Router } from 'express'

export const buildsRouter = Router()
