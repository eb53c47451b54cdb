/**
 * The part of the figure that answers to a pointer. The picture below it is the drawing of the server, in all its details;
 * here the same axes are invisible, and so are the lines, which are wide enough to be met by a finger.
 */
import { useMemo } from 'react'
import { Line, LineChart, ReferenceDot, ReferenceLine, XAxis, YAxis } from 'recharts'
import type { LongView } from '../../lib/figures/long-view'

interface Props {
  readonly view: LongView
  readonly width: number
  readonly height: number
  /** Of the plot without the ribbons, over which the line of the cursor goes on. */
  readonly plotHeight: number
  readonly index: number | null
  readonly move: (index: number) => void
  readonly leave: () => void
  readonly light: (slot: number | null) => void
  readonly choose: (slot: number) => void
}

const NO_MARGIN = { top: 0, right: 0, bottom: 0, left: 0 }

export function CursorChart(props: Props) {
  const { view, width, height, plotHeight, index, move, leave, light, choose } = props
  const { window, curves, readings } = view
  const rows = useMemo(() => readings.times.map((_, i) => i), [readings])
  const lowest = window.top * (1 - height / plotHeight)
  const time = index === null ? null : readings.times[index]
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
      <XAxis
        type="number"
        dataKey={(i: number) => readings.times[i]}
        domain={[window.from, window.to]}
        allowDataOverflow
        hide
      />
      <YAxis type="number" domain={[lowest, window.top]} allowDataOverflow hide />
      {curves.map(({ slot, name }) => (
        <Line
          key={slot}
          name={name}
          dataKey={(i: number) => readings.scales[slot]?.[i]}
          type="linear"
          className="touchable"
          dot={false}
          activeDot={false}
          isAnimationActive={false}
          onMouseEnter={() => light(slot)}
          onMouseLeave={() => light(null)}
          onClick={() => choose(slot)}
        />
      ))}
      {time !== null && time !== undefined && index !== null && (
        <>
          <ReferenceLine x={time} className="cursor-line" />
          {curves.map(({ slot }) => (
            <ReferenceDot
              key={slot}
              x={time}
              y={readings.scales[slot]?.[index] ?? Number.NaN}
              r={4.5}
              className={`cursor-dot slot-${slot}`}
            />
          ))}
        </>
      )}
    </LineChart>
  )
}
