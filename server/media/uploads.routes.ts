import { Router } from 'express'

/** Stands before express-session: tus takes the response over. */
export const uploadsRouter = Router()
