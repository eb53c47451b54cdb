/** Errors of distances along our line of sight. */
import { spanSinceNow } from '../history/event'
import { hubbleLengthMpc } from '../units'
import { shared, sightIn } from './block'
import { EPS, errors, FEW, placed, spanErrors, valuesOf } from './errors'

/** Of D_M in Mpc: dD_M = √(1 + Ω_k D_M²) dχ. */
export const transverseErrors = shared((block) => {
  if (block.phase !== 'past') return block.take().fill(Number.NaN)
  const mpc = hubbleLengthMpc(block.subject.scenario.h0)
  const { curvature } = block.subject.budget
  const [distance, chi] = [valuesOf('transverse', block), sightErrors(block)]
  return errors((_, i) => {
    const slope = Math.sqrt(Math.max(0, 1 + curvature * (distance[i] / mpc) ** 2))
    return (slope * chi[i] + FEW * EPS * (slope * sightIn(block)[i])) * mpc + FEW * EPS * distance[i]
  })(block)
})

export const angularErrors = shared((block) => {
  const distance = transverseErrors(block)
  return errors(
    ({ redshift }, i) => distance[i] / (1 + redshift[i]) + valuesOf('angular', block)[i] * placed(block, i),
  )(block)
})

export const luminosityErrors = shared((block) => {
  const distance = transverseErrors(block)
  return errors(
    ({ redshift }, i) => distance[i] * (1 + redshift[i]) + valuesOf('luminosity', block)[i] * placed(block, i),
  )(block)
})

export const sightErrors = shared((block) =>
  spanErrors(block, spanSinceNow(block.subject.history, block, 'conformal'), 'conformal'),
)
