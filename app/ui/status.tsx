import type { Explorer } from '../../lib/answers/explorer'
import type { Trouble } from '../live/use-explorer'
import { useLate } from '../live/use-late'
import { useStill } from '../live/use-still'
import { Sentence } from './symbol'

/** Sooner nobody misses anything. Milliseconds. */
const PATIENCE = 300

interface Props {
  readonly view: Explorer
  readonly moving: boolean
  readonly waiting: boolean
  readonly trouble: Trouble | null
}

/** At the lower edge: that something is still on its way, or why it does not come. */
export function Status({ view, moving, waiting, trouble }: Props) {
  const late = useLate(waiting && !trouble, PATIENCE)
  // What stays the same is not said again.
  const said = useStill(told(view), moving || waiting)
  return (
    <>
      {trouble && (
        <div className={trouble.grave ? 'state trouble' : 'state'} role={trouble.grave ? 'alert' : 'status'}>
          <span>
            <Sentence text={trouble.message} />
          </span>
          {trouble.again && (
            <button type="button" className="act" onClick={trouble.again}>
              Try again
            </button>
          )}
        </div>
      )}
      {late && (
        <p className="state" role="status">
          Calculating
        </p>
      )}
      <p className="spoken" role="status">
        {said}
      </p>
    </>
  )
}

/** For those who do not see the page change. */
function told({ scenarios, place }: Explorer): string {
  const scenario = scenarios[place.focus]
  return scenario ? `${scenario.name}: ${scenario.verdict.sentences[0] ?? ''}` : ''
}
