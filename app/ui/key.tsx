import { dashOf } from '../../lib/figures/dash'

const WIDTH = 3

/** A stretch of the scenario's line: hue and dash as in the figure. */
export function Key({ slot }: { readonly slot: number }) {
  return (
    <svg className={`key slot-${slot}`} height={WIDTH + 1} aria-hidden="true">
      <line
        x1={WIDTH}
        x2="100%"
        y1={WIDTH / 2 + 0.5}
        y2={WIDTH / 2 + 0.5}
        className="curve"
        strokeWidth={WIDTH}
        strokeDasharray={dashOf(slot, WIDTH) ?? undefined}
      />
    </svg>
  )
}
