/** `npm run build`: the production client, built only when anything it is made from has changed. */
import { buildClientWhenChanged } from './build-client'

await buildClientWhenChanged()
