import { Outlet } from 'react-router-dom'
import { followPerson } from '@/app/preferences'
import { ErrorState } from '@/components/ErrorState'
import { LoadingPage } from '@/components/LoadingPage'
import { PlainFrame } from '@/components/PlainFrame'
import { SessionGate } from '@/features/people/SessionGate'
import { LiveProvider } from '@/lib/live/LiveProvider'
import { SignInPage } from '@/pages/sign-in/SignInPage'

/** All screens: only for those who are signed in, and kept fresh by live events. */
export function SignedInRoot() {
  return (
    <SessionGate
      signIn={(ended) => <SignInPage ended={ended} />}
      loading={<LoadingPage />}
      failed={(error, retry) => (
        <PlainFrame>
          <ErrorState error={error} onRetry={retry} />
        </PlainFrame>
      )}
      onPerson={followPerson}
    >
      {(holds) => (
        <LiveProvider follow={holds}>
          <Outlet />
        </LiveProvider>
      )}
    </SessionGate>
  )
}
