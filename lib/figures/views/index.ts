/** The views below the long one, in the order of the page; the first is shown unless someone chooses another. */
import { CONTENTS } from './contents'
import { DISTANCES } from './distances'
import { RATE } from './rate'
import { REACH } from './reach'
import type { View } from './view'

export const VIEWS: readonly [View, ...View[]] = [REACH, CONTENTS, RATE, DISTANCES]
