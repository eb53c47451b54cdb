/** The ruler of the page and its table: the same numbers, reasons once, complaints where they belong. */
import { describe, expect, it } from 'vitest'
import { askRuler, askRulerTable } from '../../lib/answers/ask-ruler'
import { askAt } from '../../lib/answers/at'
import { rulerOf } from '../../lib/answers/ruler-view'
import { expectPrinted } from '../world/published'

const HOME = { version: '1.0.0', base: '' }
const TWO = 's=h0:70,matter:0.3,as:One&s=h0:67.66,matter:0.3111,eos:constant,w:-0.9,as:Two'
const view = (query: string) => {
  const keys = new URLSearchParams(query)
  return rulerOf(keys.getAll('s'), (key) => keys.get(key) ?? undefined)
}

function table(query: string) {
  const question = askRulerTable(new URLSearchParams(query), HOME)
  if (!question.ok) return question.problems
  const answer = question.value.answer()
  if (!answer.ok) throw new Error('no answer')
  return [...answer.value.pieces()].join('')
}

/** A number as the page shows it, as a plain decimal. */
const plain = (text: string | null | undefined) => (text ?? 'none').replace(/\s/g, '').replace('−', '-')

/** The lines of a CSV that are no remarks; there is no quoted comma in numbers and heads. */
const rows = (csv: string) =>
  csv
    .split('\r\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map((line) => line.replace(/^"[^"]*"/, 'code').split(','))

describe('the view', () => {
  it('reads what is chosen in every scenario, as /api/at does', () => {
    const { at, scenarios, notes } = view(`${TWO}&at=1.9&read=age,comoving,hubble`)
    expect(scenarios.map(({ name }) => name)).toEqual(['One', 'Two'])
    expect(at.map(({ key }) => key)).toEqual(['age', 'comoving', 'hubble'])
    expect(notes).toEqual([])
    const reading = askAt(new URLSearchParams(`${TWO}&z=1.9&columns=age,comoving,hubble`))
    const answer = reading.ok ? reading.value.answer() : reading
    if (!answer.ok) throw new Error('no answer')
    at.forEach(({ cells }, column) => {
      cells.forEach((text, slot) => {
        const value = answer.value.scenarios[slot]?.rows[0]?.[column] ?? Number.NaN
        expectPrinted(value, plain(text))
      })
    })
  })

  it('says each reason once', () => {
    const { at, notes } = view('s=h0:70,matter:0.3,as:One&at=-0.5&read=comoving,angular,age')
    expect(at.map(({ cells }) => cells[0] === null)).toEqual([true, true, false])
    expect(notes).toEqual([
      'One, comoving distance, angular diameter distance: it lies in the future: no line of sight leads there.',
    ])
    expect(view(`${TWO}&at=-0.5&read=comoving,age`).notes).toEqual([
      'Comoving distance: it lies in the future: no line of sight leads there.',
    ])
    expect(view(`${TWO}&epoch=age&at=-3`).notes).toEqual(['Nothing lies before the origin.'])
    expect(view(`${TWO}&epoch=lookback&at=13.48`).notes).toEqual(['One: this is before the origin.'])
  })

  it('reads between two epochs where a second is given', () => {
    expect(view(`${TWO}&at=0.5`).between).toEqual([])
    expect(view(`${TWO}&at=0.5&until=2`).between.map(({ key }) => key)).toContain('criticalSurfaceDensity')
  })

  it('complains beside the field and reads nothing', () => {
    const { at, complaints } = view(`${TWO}&at=minus`)
    expect(at).toEqual([])
    expect(complaints.at).toMatch(/Allowed: a number above −1/)
  })

  it('has lengths in units with h', () => {
    // c/H₀ times 2(1 − 1/√(1 + z)) in flat dust: 2997.92458 h⁻¹ Mpc times 2(1 − 1/2) at z = 3, whatever H₀.
    const { at } = view('s=h0:50,matter:1,cmb:0&at=3&units=h&read=comoving,hubble')
    expect(at[0]).toMatchObject({ unit: 'h⁻¹ Mpc', cells: ['2997.92'] })
    expect(at[1]).toMatchObject({ unit: 'km/s/Mpc' })
    const typed = view('s=h0:50,matter:1,cmb:0&epoch=comoving&at=2997.92458&units=h&read=redshift')
    expect(typed.at[0]?.cells).toEqual(['3.0000'])
  })
})

describe('the table', () => {
  it('has a row for each scenario, with the epoch whether or not it was among the readings', () => {
    const csv = table(`${TWO}&at=1.9&until=2.1&read=age,skyVolume&format=csv`) as string
    const [head, one, two, ...rest] = rows(csv)
    expect(head?.slice(0, 4)).toEqual(['scenario', 'redshift', 'age', 'skyVolume'])
    expect(head).toContain('shellVolume')
    expect(one?.[1]).toBe('1.9')
    expect(two).toHaveLength(head?.length ?? 0)
    expect(rest).toEqual([])
    expect(csv).toContain('# link: /?s=h0:70,matter:0.3,as:One&s=')
    expect(csv).toContain('at=1.9&until=2.1&read=age,skyVolume')
  })

  it('reads back to the rounded numbers of the page', () => {
    const query = `${TWO}&at=1.9&until=2.1`
    const [head, ...body] = rows(table(`${query}&format=csv`) as string)
    const { at, between } = view(query)
    for (const { key, cells } of [...at, ...between]) {
      cells.forEach((text, slot) => {
        const full = Number(body[slot]?.[head?.indexOf(key) ?? -1])
        expectPrinted(full, plain(text))
      })
    }
  })

  it('refuses what the page complains of, and unknown keys', () => {
    expect(table(`${TWO}&at=x`)).toMatchObject([{ parameter: 'at', allowed: 'a number above −1' }])
    expect(table(`${TWO}&format=xls`)).toMatchObject([{ parameter: 'format' }])
    expect(askRuler(new URLSearchParams('rows=3')).ok).toBe(false)
  })
})
