import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { QueryClientProvider } from '@tanstack/react-query'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Role } from '#shared/access/permissions'
import { createQueryClient } from '@/app/query-client'
import { PrintLabels } from '@/features/labels/components/PrintLabels'
import { PersonContext } from '@/features/people/person-context'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf, problem } from '../../support/fake-api'
import { ORDER_ID, pieceCode } from './counter-data'

const MADE = {
  id: '00000000-0000-4000-8000-00000000000a',
  paper: 'letter',
  codes: [pieceCode(1), pieceCode(2)],
  reprinted: [pieceCode(2)],
  by: 'Ines Marrowby',
  at: '2026-03-02T14:00:00.000Z',
}

const show = (role: Role) => {
  render(
    <QueryClientProvider client={createQueryClient()}>
      <PersonContext value={personOf(role)}>
        <PrintLabels of={{ kind: 'order', orderId: ORDER_ID }} />
      </PersonContext>
    </QueryClientProvider>,
  )
  return userEvent.setup()
}

beforeEach(() => holdCsrfToken('inside'))

describe('printing labels', () => {
  it('writes the print down, links to its PDF and says who has two labels now', async () => {
    const api = fakeApi({ 'POST /api/label-prints': () => json(MADE, 201) })
    const user = show('counter')
    await user.selectOptions(screen.getByLabelText('Labels on'), 'letter')
    await user.click(screen.getByRole('button', { name: 'Print the order’s labels' }))
    const link = await screen.findByRole('link', { name: 'Open 2 labels (PDF)' })
    expect(link).toHaveAttribute('href', `/api/label-prints/${MADE.id}/labels.pdf`)
    expect(screen.getByRole('status')).toHaveTextContent('1 of them had a label before')
    expect(api.seen('POST /api/label-prints')[0]?.body).toEqual({
      of: { kind: 'order', orderId: ORDER_ID },
      paper: 'letter',
    })
  })

  it('remembers the paper of this device', async () => {
    fakeApi()
    const user = show('counter')
    await user.selectOptions(screen.getByLabelText('Labels on'), 'a4')
    show('counter')
    expect(screen.getAllByLabelText('Labels on').at(-1)).toHaveValue('a4')
  })

  it('says why nothing was printed, and can be pressed again', async () => {
    fakeApi({ 'POST /api/label-prints': () => problem('not-found') })
    const user = show('counter')
    await user.click(screen.getByRole('button', { name: 'Print the order’s labels' }))
    expect(await screen.findByRole('alert')).toBeVisible()
    expect(screen.getByRole('button', { name: 'Print the order’s labels' })).toBeEnabled()
  })

  it('is not offered to a crew', () => {
    fakeApi()
    show('crewLead')
    expect(screen.queryByRole('button')).toBeNull()
  })
})
