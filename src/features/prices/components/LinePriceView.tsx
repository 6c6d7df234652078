import { useTranslation } from 'react-i18next'
import type { LineQuote } from '#shared/pricing/line-quote'
import { Disclosure } from '@/components/Disclosure'
import { useFormats } from '@/lib/format/useFormats'
import { useNoPriceWords } from '../useNoPriceWords'
import { PriceBreakdown } from './PriceBreakdown'

/** What a line costs, with what it is made of to be opened, or why it has no price; nothing while neither is known. */
export function LinePriceView({ quote }: { readonly quote: LineQuote | null }) {
  const { t } = useTranslation('prices')
  const { money } = useFormats()
  const noPriceWords = useNoPriceWords()
  if (quote?.price) {
    return (
      <Disclosure
        summary={
          <>
            {t('line')} <span className="ml-2 font-figure">{money(quote.price.cents)}</span>
          </>
        }
      >
        <PriceBreakdown price={quote.price} />
      </Disclosure>
    )
  }
  return quote?.noPrice ? <p className="text-ochre">{noPriceWords(quote.noPrice)}</p> : null
}
