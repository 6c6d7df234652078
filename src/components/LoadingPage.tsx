import { LoadingState } from '@/components/LoadingState'
import { PlainFrame } from '@/components/PlainFrame'

export function LoadingPage() {
  return (
    <PlainFrame>
      <LoadingState />
    </PlainFrame>
  )
}
