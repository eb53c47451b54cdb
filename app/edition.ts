/** What is being served. Read on the server only: the engine stays out of the pages' scripts. */
import { ENGINE } from '../lib/solve'
import { version } from '../package.json'

export const EDITION = { version, engine: ENGINE }
