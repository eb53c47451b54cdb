/** Horizons and light cones of the scenario in focus, in proper, comoving or conformal coordinates. */
import { instantAt, isInstant } from '../../quantities/instant'
import type { Solution } from '../../solve'
import { extrapolates } from '../../words/beyond'
import { galaxySentences } from '../../words/galaxy'
import { significant, withUnit } from '../../words/number'
import { reachSentence } from '../../words/reach'
import { fromNow, isNow } from '../../words/time'
import type { Values } from '../along'
import type { Chart, Spot } from '../chart'
import { readingsOf } from '../readings'
import { remembered } from '../remembered'
import type { Point, Ranges } from '../sample'
import { linearRange } from '../scale'
import { againstOf, alternativeOf, futureOf } from './describe'
import { followedOf, type Galaxy, galaxyAt } from './galaxy'
import { CONE_TONE, GALAXY_TONE, PATHS } from './paths'
import { curveOf } from './quantity-chart'
import { type Asked, focusOf, rangeOf, type View } from './view'

const BY = ['time', 'logtime', 'scale']
const STEPS = 160

const isProper = ({ show }: Asked): boolean => show.key === 'proper'

function reach(asked: Asked): Chart {
  const solution = focusOf(asked)
  const galaxy = galaxyAt(solution, asked.galaxy)
  const x = rangeOf({ ...asked, solutions: [solution] }, true)
  const y = linearRange(0, topOf(solution, galaxy, isProper(asked)))
  const paths = pathsOf(asked, galaxy)
  const readings = readingsOf(
    paths.map(({ values }) => values),
    x,
    [asked.by.now],
    STEPS,
  )
  const coordinate = isProper(asked) ? 'proper distance' : 'comoving distance'
  const axes = {
    x: { ...asked.by.quantity, ...x },
    y: { quantity: 'distance', label: coordinate, symbol: '', unit: 'Gly', ...y },
  }
  const special = edgesOf(asked)
  const curves = paths.map(({ values, ...look }) => {
    const curve = curveOf(values, { x, y }, { ...look, special })
    return curve.finish === null ? curve : { ...curve, finish: { ...curve.finish, edge: 'along' as const } }
  })
  return {
    title: `Horizons and light cones of ${solution.label}`,
    ...axes,
    curves,
    references: referencesOf(solution, isProper(asked), y.to),
    spots: galaxy ? spotsOf(asked, galaxy, { x, y }) : [],
    ribbons: [],
    now: asked.by.now,
    future: futureOf(asked.by, extrapolates(solution.scenario)),
    readings,
    caption: `Horizons and light paths of ${solution.label}: ${coordinate} from us against ${againstOf(axes.x)}.`,
    alternative: alternativeOf(axes.x, axes.y, curves, readings),
  }
}

function pathsOf(asked: Asked, galaxy: Galaxy | null) {
  const solution = focusOf(asked)
  const instantAtPlace = remembered((place) => asked.by.instant(solution, place))
  return PATHS.map(({ tone, name, comoving }, dash) => {
    const values: Values = (places) =>
      places.map((place) => {
        const instant = instantAtPlace(place)
        const distance = isInstant(instant) ? comoving(solution, instant, galaxy?.distance ?? null) : null
        return distance === null || !isProper(asked) || !isInstant(instant) ? distance : distance * instant.scale
      })
    const named = tone === GALAXY_TONE ? `galaxy at z = ${asked.galaxy}` : name
    return { tone, name: named, dash, strong: tone === CONE_TONE, values }
  })
}

/** In comoving coordinates light sent today comes closer and closer to a limit. */
function referencesOf({ measures }: Solution, proper: boolean, top: number): Chart['references'] {
  const limit = measures.eventHorizon.value
  if (proper || limit === null || limit > top) return []
  const distance = withUnit(significant(limit, 3), 'Gly')
  return [{ axis: 'y', at: limit, label: `limit of light sent today, ${distance}`, short: `limit, ${distance}` }]
}

/** Close to the origin and the end, where conformal time runs fast. */
function edgesOf(asked: Asked): number[] {
  const solution = focusOf(asked)
  const { origin, end } = solution
  const times = [
    ...(origin.time === null ? [] : [origin.time * (1 - 1e-7), origin.time * (1 - 1e-5)]),
    ...(end.time === null ? [] : [end.time * (1 - 1e-6)]),
  ]
  return times.flatMap((time) => {
    const instant = instantAt(solution, 'time', time)
    return isInstant(instant) ? [asked.by.place(solution, instant)] : []
  })
}

/** Of the figure over what it must hold. Tuned by eye. */
const HEADROOM = 1.1

/** High enough for today's particle horizon, or what there is in its place; in comoving coordinates for all that is ever seen. */
function topOf({ measures }: Solution, galaxy: Galaxy | null, proper: boolean): number {
  const [seen, left] = [measures.particleHorizon.value, measures.eventHorizon.value]
  const today = seen ?? Math.max(left ?? 0, 3 * (measures.hubbleRadius.value ?? 1))
  const followed = galaxy && galaxy.distance < 3 * today ? galaxy.distance : 0
  return HEADROOM * Math.max(proper ? today : (measures.futureVisibility.value ?? today), followed)
}

function spotsOf(asked: Asked, { distance, seen, last }: Galaxy, { x, y }: Ranges): Spot[] {
  const spots = [
    { instant: seen, label: 'seen today' },
    ...(last ? [{ instant: last, label: `last light, ${isNow(last.time) ? 'now' : fromNow(last.time)}` }] : []),
  ]
  return spots.flatMap(({ instant, label }) => {
    const at: Point = [asked.by.place(focusOf(asked), instant), isProper(asked) ? distance * instant.scale : distance]
    const inside = at[0] >= x.from && at[0] <= x.to && at[1] >= y.from && at[1] <= y.to
    return inside ? [{ tone: GALAXY_TONE, at, label }] : []
  })
}

export const REACH: View = {
  key: 'reach',
  title: 'Reach',
  choice: 'Coordinates',
  shows: [
    { key: 'proper', word: 'proper', by: BY, compare: [], alone: true },
    { key: 'comoving', word: 'comoving', by: [...BY, 'logscale'], compare: [], alone: true },
    { key: 'conformal', word: 'conformal', by: ['conformal'], compare: [], alone: true },
  ],
  chart: reach,
  notes: (asked) => {
    const solution = focusOf(asked)
    const light = reachSentence(solution)
    return [...(light === null ? [] : [light]), ...galaxySentences(followedOf(solution, asked.galaxy))]
  },
  galaxy: true,
}
