import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import type { ComponentProps } from 'react'
import { MemoryRouter } from 'react-router-dom'
import { describe, expect, it, vi } from 'vitest'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { OfflineError } from '@/lib/api/api-errors'

interface Bundle {
  readonly code: string
  readonly pieces: number
}

const column = columnsOf<Bundle>()
const columns = column.columns([
  column.accessor('code', { header: 'Bundle' }),
  column.accessor('pieces', { header: 'Pieces', meta: { figure: true, align: 'end' } }),
])
const ROWS: readonly Bundle[] = [
  { code: 'B1', pieces: 10 },
  { code: 'B2', pieces: 8 },
  { code: 'B3', pieces: 22 },
]

function show(props: Partial<ComponentProps<typeof DataTable<Bundle>>>) {
  render(
    <MemoryRouter>
      <DataTable
        caption="Bundles on the rack"
        rows={ROWS}
        columns={columns}
        rowId={({ code }) => code}
        empty={<EmptyState title="No bundle lies here." hint="Strap bent pieces first." />}
        {...props}
      />
    </MemoryRouter>,
  )
  return userEvent.setup()
}

describe('the table', () => {
  it('lists its rows under its caption', () => {
    show({})
    const table = screen.getByRole('table', { name: 'Bundles on the rack' })
    const rows = within(table).getAllByRole('row')
    expect(rows).toHaveLength(4)
    expect(
      within(rows[3] ?? table)
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual(['B3', '22'])
  })

  it('says that it is loading until there are rows', () => {
    show({ rows: undefined })
    expect(screen.getByRole('status')).toHaveTextContent('Loading')
    expect(screen.queryByRole('table')).not.toBeInTheDocument()
  })

  it('says what to do when there is nothing', () => {
    show({ rows: [] })
    expect(screen.getByText('No bundle lies here.')).toBeVisible()
    expect(screen.getByText('Strap bent pieces first.')).toBeVisible()
  })

  it('says what happened, what is safe and what to do when it fails, and tries again', async () => {
    const retry = vi.fn()
    const user = show({ rows: undefined, error: new OfflineError(null), onRetry: retry })
    const alert = screen.getByRole('alert')
    expect(alert).toHaveTextContent('No answer from the server.')
    expect(alert).toHaveTextContent('stays here')
    expect(alert).toHaveTextContent('try again')
    await user.click(screen.getByRole('button', { name: 'Try again' }))
    expect(retry).toHaveBeenCalledOnce()
  })

  it('keeps its rows when reading more fails', () => {
    show({ error: new OfflineError(null) })
    expect(screen.getAllByRole('row')).toHaveLength(4)
    expect(screen.getByRole('alert')).toBeVisible()
  })

  it('offers more while there is more, once at a time', async () => {
    const onMore = vi.fn()
    const user = show({ paging: { hasMore: true, loading: false, onMore } })
    await user.click(screen.getByRole('button', { name: 'Show more' }))
    expect(onMore).toHaveBeenCalledOnce()
  })

  it('does not ask for more again while more is being read', async () => {
    const onMore = vi.fn()
    const user = show({ paging: { hasMore: true, loading: true, onMore } })
    await user.click(screen.getByRole('button', { name: /Show more/ }))
    expect(onMore).not.toHaveBeenCalled()
  })

  it('offers nothing more at the end', () => {
    show({ paging: { hasMore: false, loading: false, onMore: vi.fn() } })
    expect(screen.queryByRole('button', { name: 'Show more' })).not.toBeInTheDocument()
  })

  it('leads from a row to what it lists, by arrow keys too', async () => {
    const user = show({ rowLink: ({ code }) => `/rack/bundles/${code}` })
    const link = (name: string) => screen.getByRole('link', { name })
    expect(link('B2')).toHaveAttribute('href', '/rack/bundles/B2')
    link('B1').focus()
    await user.keyboard('{ArrowDown}')
    expect(link('B2')).toHaveFocus()
    await user.keyboard('{End}')
    expect(link('B3')).toHaveFocus()
    await user.keyboard('{ArrowDown}')
    expect(link('B3')).toHaveFocus()
    await user.keyboard('{Home}')
    expect(link('B1')).toHaveFocus()
  })
})
