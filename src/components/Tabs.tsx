import type { ReactNode } from 'react'
import { Tab, TabList, TabPanel, Tabs as AriaTabs } from 'react-aria-components'

export interface TabItem {
  readonly id: string
  readonly label: string
  readonly content: ReactNode
}

interface Props {
  readonly label: string
  readonly items: readonly TabItem[]
  readonly selected?: string
  readonly onSelect?: (id: string) => void
}

/** Views of one thing on one screen; for screens beside each other there is SubNav. */
export function Tabs({ label, items, selected, onSelect }: Props) {
  return (
    <AriaTabs selectedKey={selected} onSelectionChange={(key) => onSelect?.(String(key))}>
      <TabList aria-label={label} className="flex gap-5 overflow-x-auto border-b border-rule">
        {items.map(({ id, label: word }) => (
          <Tab
            key={id}
            id={id}
            className="inline-flex min-h-target cursor-pointer items-center border-b-3 border-transparent whitespace-nowrap text-scribe data-selected:border-dye data-selected:font-bold data-selected:text-ink"
          >
            {word}
          </Tab>
        ))}
      </TabList>
      {items.map(({ id, content }) => (
        <TabPanel key={id} id={id} className="pt-4">
          {content}
        </TabPanel>
      ))}
    </AriaTabs>
  )
}
