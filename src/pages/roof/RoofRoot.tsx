import { useCallback, useLayoutEffect, useRef } from 'react'
import { Outlet, useLocation, useNavigate } from 'react-router-dom'
import type { Order } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Deliveries } from '@/features/orders/components/Deliveries'
import type { Slot } from '@/features/orders/draft/draft-store'
import { draftPath } from './draft-path'

/** All screens of the roof: submitted orders of this device are sent whichever of them is open. */
export function RoofRoot() {
  const navigate = useNavigate()
  const { pathname } = useLocation()
  const here = useRef(pathname)

  useLayoutEffect(() => {
    here.current = pathname
  }, [pathname])

  const onDelivered = useCallback(
    (slot: Slot, order: Order) => {
      // Whoever waited for it sees the order; whoever went on is not called away.
      if (here.current === draftPath(slot)) {
        void navigate(paths.roof.order(order.id), { replace: true })
      }
    },
    [navigate],
  )

  return (
    <>
      <Deliveries onDelivered={onDelivered} />
      <Outlet />
    </>
  )
}
