import { Band, type BandAnswer } from '@/components/Band'

/** The answer to a scan across the whole width, at the top of a page that has margins. */
export function CounterBand({ answer }: { readonly answer: BandAnswer | null }) {
  return (
    <div className={`-mx-(--gutter) -mt-5 ${answer ? 'mb-10' : 'mb-5'}`}>
      <Band answer={answer} />
    </div>
  )
}
