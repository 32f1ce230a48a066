import { Router } from 'express'

export const benchStopsRouter = Router()
