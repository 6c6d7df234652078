import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'

interface Props {
  readonly query: {
    readonly hasNextPage: boolean
    readonly isFetchingNextPage: boolean
    readonly fetchNextPage: () => Promise<unknown>
  }
}

/** The next page of a list, where there is one. */
export function MoreButton({ query }: Props) {
  const { t } = useTranslation('components')
  if (!query.hasNextPage) return null
  return (
    <Button
      className="mt-4"
      pending={query.isFetchingNextPage}
      onClick={() => void query.fetchNextPage()}
    >
      {t('table.more')}
    </Button>
  )
}
