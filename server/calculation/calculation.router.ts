/** The calculation for programs: a layout file in, its results out. The headless command gives the same. */
import { Router } from 'express'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { signedIn } from '../http/authenticate'
import { limitRequests } from '../http/rate-limit'
import { documentFromFile } from '../layouts/layouts.service'

/** Each costs milliseconds of the one thread that also serves everybody else. */
const CALCULATIONS = { max: 240, windowMs: 60_000 }

export function calculationRouter(): Router {
  const router = Router()
  router.post(
    '/api/calculate',
    limitRequests(CALCULATIONS, (request) => signedIn(request).userId),
    (request, response) => {
      response.json(recalculateLayout(documentFromFile(request.body)))
    },
  )
  return router
}
