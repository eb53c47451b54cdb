import { memo, useDeferredValue } from 'react'
import type { Shown } from '../../lib/figures/picture'
import { DataTable, tableOf } from './data-table'

interface FigureProps {
  readonly figure: Shown
}

/** In the middle of a gesture a figure keeps its readings, and so does this. */
const hasSameNumbers = (one: FigureProps, other: FigureProps) => one.figure.readings === other.figure.readings

/** The figure as numbers. */
export const FigureTable = memo(function FigureTable({ figure }: FigureProps) {
  return <DataTable {...tableOf(useDeferredValue(figure))} />
}, hasSameNumbers)
