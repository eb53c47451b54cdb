import fc from 'fast-check'
import { expect, test } from 'vitest'
import { fileName } from '../../lib/formats/file-name'

test.each([
  [['Steady light'], 'longhence-steady-light.csv'],
  [['Été', 'à  deux'], 'longhence-ete-a-deux.csv'],
  [['宇宙'], 'longhence.csv'],
  [['../../etc/passwd'], 'longhence-etc-passwd.csv'],
  [['a"; filename="b.exe'], 'longhence-a-filename-b-exe.csv'],
  [['con'], 'longhence-con.csv'],
  [['x'.repeat(500)], `longhence-${'x'.repeat(50)}.csv`],
])('%j becomes %s', (names, expected) => expect(fileName(names, 'csv')).toBe(expected))

test('never anything but letters, digits and hyphens, whatever the names', () => {
  fc.assert(
    fc.property(fc.array(fc.string({ unit: 'binary' }), { maxLength: 6 }), (names) => {
      expect(fileName(names, 'csv')).toMatch(/^longhence(?:-[a-z0-9]+)*\.csv$/)
      expect(fileName(names, 'csv').length).toBeLessThanOrEqual(64)
    }),
  )
})
