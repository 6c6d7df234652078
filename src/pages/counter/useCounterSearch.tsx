import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import { paths } from '@/app/paths'
import { SearchField } from '@/components/SearchField'
import { useCodeLookup } from '@/features/hand-off/useCodeLookup'
import { CounterBand } from './CounterBand'

/**
 * The search of the screens that are no list of orders: Enter takes a label to its hand-off, and
 * anything else to the search through all orders. The band answers a label that leads nowhere.
 */
export function useCounterSearch() {
  const { t } = useTranslation('counter')
  const navigate = useNavigate()
  const [text, setText] = useState('')
  const { lookUp, answer } = useCodeLookup(({ orderId }) => {
    void navigate(paths.counter.handOffOrder(orderId))
  })
  return {
    search: (
      <SearchField
        label={t('search.label')}
        placeholder={t('search.placeholder')}
        value={text}
        onChange={setText}
        onSubmit={(asked) => {
          if (lookUp(asked)) setText('')
          else void navigate(paths.counter.search(asked.trim()))
        }}
      />
    ),
    band: <CounterBand answer={answer} />,
  }
}
