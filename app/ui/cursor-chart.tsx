/**
 * The part of a figure that answers to a pointer. The picture below it is the drawing of the server, in all its details;
 * here the same axes are invisible, and so are the lines, which are wide enough to be met by a finger. Both axes count in
 * parts of the plot, however their quantities run.
 */
import { useMemo } from 'react'
import { Line, LineChart, ReferenceDot, ReferenceLine, XAxis, YAxis } from 'recharts'
import type { Shown } from '../../lib/figures/picture'
import { fractionOf } from '../../lib/figures/scale'

interface Props {
  readonly figure: Shown
  readonly width: number
  readonly height: number
  /** Of the plot without what hangs below it, over which the line of the cursor goes on. */
  readonly plotHeight: number
  readonly index: number | null
  readonly move: (index: number) => void
  readonly leave: () => void
  readonly light: (curve: number | null) => void
  /** Null where a click leads nowhere. */
  readonly choose: ((curve: number) => void) | null
}

const NO_MARGIN = { top: 0, right: 0, bottom: 0, left: 0 }

interface Row {
  readonly x: number
  readonly y: readonly (number | null)[]
}

export function CursorChart(props: Props) {
  const { figure, width, height, plotHeight, index, move, leave, light, choose } = props
  const rows = useMemo(() => rowsOf(figure), [figure])
  const row = index === null ? undefined : rows[index]
  const follow = ({ activeTooltipIndex }: { readonly activeTooltipIndex?: number | string | null }) => {
    if (activeTooltipIndex !== undefined && activeTooltipIndex !== null) move(Number(activeTooltipIndex))
  }
  return (
    <LineChart
      width={width}
      height={height}
      data={rows}
      margin={NO_MARGIN}
      accessibilityLayer={false}
      onMouseMove={follow}
      onTouchMove={follow}
      onTouchStart={follow}
      onMouseLeave={leave}
    >
      <XAxis type="number" dataKey={(one: Row) => one.x} domain={[0, 1]} allowDataOverflow hide />
      <YAxis type="number" domain={[1 - height / plotHeight, 1]} allowDataOverflow hide />
      {figure.curves.map(({ tone, name }, i) => (
        <Line
          key={tone}
          name={name}
          dataKey={(one: Row) => one.y[i]}
          type="linear"
          className={choose ? 'touchable chosen' : 'touchable'}
          dot={false}
          activeDot={false}
          isAnimationActive={false}
          onMouseEnter={() => light(i)}
          onMouseLeave={() => light(null)}
          onClick={() => choose?.(i)}
        />
      ))}
      {row && (
        <>
          <ReferenceLine x={row.x} className="cursor-line" />
          {figure.curves.map(({ tone }, i) => (
            <ReferenceDot key={tone} x={row.x} y={row.y[i] ?? Number.NaN} r={4.5} className={`cursor-dot ${tone}`} />
          ))}
        </>
      )}
    </LineChart>
  )
}

function rowsOf({ x, y, readings }: Shown): readonly Row[] {
  return readings.places.map((place, i) => ({
    x: fractionOf(x, place),
    y: readings.values.map((values) => partOf(y, values[i] ?? null)),
  }))
}

function partOf(y: Shown['y'], value: number | null): number | null {
  if (value === null) return null
  const part = fractionOf(y, value)
  return Number.isFinite(part) ? part : null
}
