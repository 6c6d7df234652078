import type { ReactNode } from 'react'
import { Mark } from '@/components/Mark'

/** A page outside every place: the wordmark and one column. */
export function PlainFrame({ children }: { readonly children: ReactNode }) {
  return (
    <div className="mx-auto flex min-h-dvh max-w-md flex-col px-5 pt-8 pb-6 sm:pt-[12vh]">
      <p className="mb-10 flex items-center gap-3 text-title font-bold">
        <Mark className="size-9" />
        Foldyard
      </p>
      <main id="main" className="flex flex-1 flex-col sm:flex-none">
        {children}
      </main>
    </div>
  )
}
