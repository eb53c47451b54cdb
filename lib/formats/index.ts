/** All formats of downloads, the default first. */
import { CSV } from './csv'
import type { Format } from './format'
import { JSON_FORMAT } from './json'

export const FORMATS: readonly Format[] = [CSV, JSON_FORMAT]
