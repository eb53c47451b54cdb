import { describe, expect, it } from 'vitest'
import { askExplorer } from '../../lib/answers/ask-explorer'
import { explorer } from '../../lib/answers/explorer'

const ask = (query: string) => askExplorer(new URLSearchParams(query))

function question(query: string) {
  const reading = ask(query)
  if (!reading.ok) throw new Error('refused')
  return reading.value
}

describe('/api/explorer', () => {
  it.each(['', 's=h0:70,as:One&s=h0:71&focus=2&theme=night', 's=h0:7o', 's=', 's=h0:70&focus=9&theme=pink'])(
    'answers as the page does: %s',
    (query) => {
      const pairs = new URLSearchParams(query)
      const codes = pairs.getAll('s')
      const keys = new Map([...pairs].filter(([key]) => key !== 's'))
      expect(question(query).answer()).toEqual({ ok: true, value: explorer({ codes, keys }) })
    },
  )

  it('is the same question in other words', () => {
    expect(question('s=matter:0.30,h0:70&focus=1').canonical).toBe(question('s=h0:70,matter:0.3&theme=pink').canonical)
    expect(question('').canonical).not.toBe(question('s=h0:70').canonical)
    expect(question('s=h0:7o').canonical).not.toBe(question('s=h0:7p').canonical)
  })

  it('leaves out the view below, and what a cursor reads, where only the long one is asked for', () => {
    const query = 's=h0:70,as:One&s=h0:71&frame=wide'
    const [brief, whole] = [question(`${query}&parts=long`), question(query)]
    const canonicals = ['', '+words', '+view'].map((more) => question(`${query}&parts=long${more}`).canonical)
    expect(new Set([...canonicals, whole.canonical]).size).toBe(4)
    expect(question(`${query}&parts=words+long`).canonical).toBe(canonicals[1])
    const answer = whole.answer()
    const { long } = (answer.ok && answer.value) || { long: null }
    expect(long?.figure.readings.places.length).toBeGreaterThan(100)
    const without = { ...long, figure: { ...long?.figure, readings: { places: [], values: [] } } }
    const words = question(`${query}&parts=long+words`).answer()
    expect(words).toEqual(answer.ok && { ok: true, value: { ...answer.value, long: without, panel: null } })
    const bare = { moments: null, measures: null, scenarios: [{ name: 'One' }, { name: 'Scenario 2' }] }
    const silent = brief.answer()
    expect(silent).toMatchObject({ ok: true, value: { ...bare, long: without, panel: null } })
    expect(silent.ok && silent.value.scenarios[0]).not.toHaveProperty('verdict')
    const viewed = question(`${query}&parts=long+view`).answer()
    expect(viewed.ok && viewed.value.panel).toEqual(answer.ok && answer.value.panel)
    expect(question(`${query}&parts=many`).canonical).toBe(whole.canonical)
  })

  it('refuses unknown and repeated keys', () => {
    expect(ask('s=h0:70&z=1')).toMatchObject({ ok: false, problems: [{ parameter: 'z' }] })
    expect(ask('focus=1&focus=2')).toMatchObject({ ok: false, problems: [{ parameter: 'focus' }] })
  })

  it('holds nothing that JSON would lose', () => {
    const reading = question('s=h0:70,eos:cpl,wa:-1&s=matter:1,cmb:0').answer()
    expect(reading.ok && JSON.parse(JSON.stringify(reading.value))).toEqual(reading.ok && reading.value)
  })
})
