/** All formats of downloads, the default first. */
import { CSV } from './csv'
import type { Format } from './format'
import { JSON_FORMAT } from './json'
import { LATEX } from './latex'
import { VOTABLE } from './votable'

export const FORMATS: readonly Format[] = [CSV, JSON_FORMAT, VOTABLE, LATEX]
