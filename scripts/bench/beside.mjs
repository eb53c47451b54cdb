/**
 * The same rows made by us and by C programs with the GNU Scientific Library, in turns; all have to agree.
 */
import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { Refusal } from '../setup/project.mjs'
import { FOLDER, inScratch, load } from './bundle.mjs'
import { median, secondsOf, shown, turnOf, undisturbed, warmUp } from './clock.mjs'

const TOLERANCE = 1e-12
/** A hundred times the tolerance: steps and rows add their errors up. */
const AGREEMENT = 100 * TOLERANCE
const ROUNDS = 25
/** Seconds of a turn. */
const TURN = 0.05
const METHODS = [
  { file: 'quadrature.c', name: 'GSL, adaptive quadrature per point', aim: 25 },
  { file: 'stepper.c', name: 'GSL, rk8pd in one run', aim: 2 },
]
const COLUMNS = ['time', 'comoving distance', 'conformal time', 'E', 'a']

/** @typedef {{make: () => unknown, rows: () => number[][], densities: () => number[], ROWS: number, FROM: number}} Ours */
/** @typedef {{name: string, aim: number, run: (repeats: number) => string[]}} Other */

export async function benchBeside() {
  const flags = output('pkg-config', ['--cflags', '--libs', 'gsl'])
  const missing = flags === null ? 'GSL' : output('gcc', ['--version']) === null ? 'gcc' : null
  console.log('\nthe same rows, side by side')
  if (flags === null || missing) {
    console.log(`  Skipped: ${missing} was not found (on Debian: apt-get install gcc pkg-config libgsl-dev).`)
    return
  }
  /** @type {Ours} */
  const ours = await load('rows.ts')
  await inScratch(async (scratch) => {
    const others = METHODS.map((one) => compiled(one, scratch, flags.trim().split(/\s+/), ours))
    agree(ours.rows(), others)
    compare(ours, others)
  })
}

/**
 * What a command prints; null where it is not there or fails.
 * @param {string} command
 * @param {readonly string[]} args
 */
function output(command, args) {
  const { status, stdout } = spawnSync(command, args, { encoding: 'utf8', cwd: FOLDER })
  return status === 0 ? stdout : null
}

/**
 * @param {typeof METHODS[number]} method
 * @param {string} scratch
 * @param {readonly string[]} flags
 * @param {Ours} ours
 * @returns {Other}
 */
function compiled({ file, name, aim }, scratch, flags, { ROWS, FROM, densities }) {
  const program = join(scratch, file.replace('.c', ''))
  if (output('gcc', ['-O3', '-std=c11', '-o', program, 'rows.c', file, ...flags, '-lm']) === null) {
    throw new Refusal(`gcc did not compile test/bench/${file}.`)
  }
  const run = (/** @type {number} */ repeats) => {
    const text = output(program, [repeats, TOLERANCE, FROM, ROWS, ...densities()].map(String))
    if (text === null) throw new Refusal(`test/bench/${file} failed.`)
    return text.trim().split('\n')
  }
  return { name, aim, run }
}

/**
 * Largest relative difference of each column. That of the comoving distance is relative to the conformal time of today, from which
 * a run in time has to subtract.
 * @param {number[][]} rows
 * @param {readonly Other[]} others
 */
function agree(rows, others) {
  const today = rows[rows.length - 1][2]
  for (const { name, run } of others) {
    const theirs = run(0).map((line) => line.split(' ').map(Number))
    const worst = COLUMNS.map((_, j) =>
      Math.max(...rows.map((row, i) => Math.abs(row[j] - theirs[i][j]) / (j === 1 ? today : row[j]))),
    )
    console.log(`  largest relative difference from ${name}:`)
    console.log(`    ${COLUMNS.map((column, j) => `${column} ${worst[j].toExponential(0)}`).join(', ')}`)
    if (!worst.every((one) => one < AGREEMENT)) throw new Refusal(`The rows differ by more than ${AGREEMENT}.`)
  }
}

/** @param {Ours} ours @param {readonly Other[]} others */
function compare({ make }, others) {
  const count = warmUp(make, TURN)
  // Starting a program leaves our pages to be copied anew, which the runs of a first turn pay for.
  const mine = () => {
    secondsOf(make, count)
    return turnOf(make, count)
  }
  const counts = others.map(({ run }) => Math.ceil(TURN / timeOf(run(1))))
  const turns = Array.from({ length: ROUNDS }, () =>
    others.map(({ run }, i) => {
      const { seconds, pace } = mine()
      return { ours: seconds, pace, theirs: timeOf(run(counts[i])) }
    }),
  )
  const all = undisturbed(turns.flat()).map(({ ours }) => ours)
  console.log(`${' '.repeat(47)}     median    minimum  ours is faster by: median  minimum   aim`)
  console.log(`  ${'ours, with the history'.padEnd(45)}${shown(median(all))}${shown(Math.min(...all))}`)
  others.forEach(({ name, aim }, i) => {
    const pairs = undisturbed(turns.map((round) => round[i]))
    const theirs = pairs.map((pair) => pair.theirs)
    const ratio = median(pairs.map((pair) => pair.theirs / pair.ours))
    const least = Math.min(...theirs) / Math.min(...all)
    const ratios = `${ratio.toFixed(2).padStart(26)}${least.toFixed(2).padStart(9)}${String(aim).padStart(6)}`
    console.log(`  ${name.padEnd(45)}${shown(median(theirs))}${shown(Math.min(...theirs))}${ratios}`)
  })
}

/**
 * Seconds per repeat, from what a program prints.
 * @param {readonly string[]} lines
 */
const timeOf = (lines) => lines.reduce((sum, line) => sum + Number(line), 0) / lines.length / 1e9
