import { type ComponentType, memo, type ReactNode, useEffect, useState } from 'react'
import type { LiveRulerProps } from '../live/ruler'
import { useSign } from '../live/use-sign'

interface Props extends Omit<LiveRulerProps, 'address'> {
  readonly address: LiveRulerProps['address'] | null
  /** True where the page shows something else than the server drew. */
  readonly changed: boolean
  /** As the server drew it. */
  readonly children: ReactNode
}

/** What the server drew stands until the live ruler has come, which nobody needs before there is a hand. */
export const RulerPlace = memo(function RulerPlace({ address, changed, children, ...rest }: Props) {
  const [Live, setLive] = useState<ComponentType<LiveRulerProps> | null>(null)
  const given = useSign()
  const wanted = given || changed
  useEffect(() => {
    if (wanted) import('../live/ruler').then((module) => setLive(() => module.default)).catch(() => undefined)
  }, [wanted])
  return Live && address ? <Live address={address} {...rest} /> : children
})
