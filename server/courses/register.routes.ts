import { Router } from 'express'

export const registerRouter = Router()
