import { screen, waitFor } from '@testing-library/react'
import { expect, it } from 'vitest'
import { profileOf } from '../../support/arbitrary-profile'
import { openBoard } from '../board/open-board'
import { BOOK, bookAnswer } from './a-price-book'

const gable = profileOf([4, 4, 0.75], [-90, 45])
const price = () => screen.getByText('a piece').nextSibling

it('tells what a piece costs, and follows the drawing at once', async () => {
  const { user } = await openBoard(gable, {
    change: { statedGirth: 9.25 },
    answers: bookAnswer(),
  })
  // 10 ft at $3 and two bends.
  await waitFor(() => expect(price()).toHaveTextContent('$30.50'))
  // Half an inch more of girth is in the next bracket.
  await user.click(screen.getByRole('button', { name: 'Set leg 1 to 4 1/2"' }))
  expect(price()).toHaveTextContent('$40.50')
})

it('says where the book ends for this girth', async () => {
  const [stock] = BOOK.stocks
  const narrow = { ...BOOK, stocks: stock ? [{ ...stock, rates: stock.rates.slice(0, 1) }] : [] }
  await openBoard(profileOf([6, 5], [90]), { answers: bookAnswer(narrow) })
  expect(
    await screen.findByText('No price: the price book ends at a girth of 9". Ask the shop.'),
  ).toBeVisible()
  expect(price()).toHaveTextContent('–')
})

it('is quiet while the price book cannot be read', async () => {
  await openBoard(gable)
  expect(price()).toHaveTextContent('–')
  expect(screen.queryByText(/No price/)).toBeNull()
})
