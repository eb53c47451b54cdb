/** What the page itself notes while a slider is dragged. */

/**
 * @typedef {{readonly value: number, readonly time: number}} Seen a value of the slider, and when
 * @typedef {{readonly inputs: readonly Seen[], readonly paints: readonly Seen[], readonly tasks: readonly number[]}} Record
 */

/** Runs in the page. The first scenario is the one that is dragged, and `main` says which one the figure shows. */
export function record() {
  /** @type {{inputs: Seen[], paints: Seen[], tasks: number[]} | null} */
  let notes = null
  const shown = () => Number(/matter:([\d.e-]+)/.exec(document.querySelector('main')?.dataset.shown ?? '')?.[1])
  const painted = () => {
    const value = shown()
    requestAnimationFrame(() => {
      const { port1, port2 } = new MessageChannel()
      // The first task after the frame has been drawn.
      port1.onmessage = () => notes?.paints.push({ value, time: performance.now() })
      port2.postMessage(null)
    })
  }
  document.addEventListener(
    'input',
    ({ target, timeStamp }) =>
      target instanceof HTMLInputElement && notes?.inputs.push({ value: Number(target.value), time: timeStamp }),
    true,
  )
  new PerformanceObserver((list) => notes?.tasks.push(...list.getEntries().map(({ duration }) => duration))).observe({
    type: 'longtask',
  })
  Object.assign(globalThis, {
    startRecord() {
      notes = { inputs: [], paints: [], tasks: [] }
      const main = document.querySelector('main')
      if (main) new MutationObserver(painted).observe(main, { attributeFilter: ['data-shown'] })
    },
    stopRecord: () => notes,
  })
}

/** @param {Record} notes */
export function results({ inputs, paints, tasks }) {
  // A slider that is dragged to the right only grows: what shows a value shows all inputs up to it.
  const waits = inputs
    .map(({ value, time }) => (paints.find((paint) => paint.value >= value && paint.time > time)?.time ?? NaN) - time)
    .filter((time) => !Number.isNaN(time))
    .sort((one, other) => one - other)
  const at = (/** @type {number} */ part) => waits[Math.floor(part * (waits.length - 1))] ?? Number.NaN
  return { count: waits.length, half: at(0.5), most: at(0.95), longest: Math.max(0, ...tasks) }
}
