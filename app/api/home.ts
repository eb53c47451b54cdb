/** Which version answers, and where: links are built from PUBLIC_URL alone, since anyone can send any Host. */
import { ENGINE } from '../../lib/solve'
import about from '../../package.json'

export const HOME = {
  version: about.version,
  base: (process.env.PUBLIC_URL ?? '').replace(/\/+$/, ''),
}

/** Answers of one edition are equal; another version, engine or place may give others. */
export const EDITION = `${HOME.version} ${ENGINE} ${HOME.base}`
