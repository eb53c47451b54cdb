import { type ComponentType, memo, type ReactNode, useEffect, useState } from 'react'
import type { LiveRulerProps } from '../live/ruler'

interface Props extends Omit<LiveRulerProps, 'address'> {
  readonly address: LiveRulerProps['address'] | null
  /** As the server drew it. */
  readonly children: ReactNode
}

/** What the server drew stands until the live ruler has come, after the rest of the page. */
export const RulerPlace = memo(function RulerPlace({ address, children, ...rest }: Props) {
  const [Live, setLive] = useState<ComponentType<LiveRulerProps> | null>(null)
  useEffect(() => {
    import('../live/ruler').then((module) => setLive(() => module.default)).catch(() => undefined)
  }, [])
  return Live && address ? <Live address={address} {...rest} /> : children
})
