import { describe, expect, test } from 'vitest'
import {
  boardOf,
  cornersOf,
  editProfile,
  EMPTY_BOARD,
  removeCorner,
  reverseWalk,
  splitLeg,
} from '@/features/drawing/model/board-document'
import {
  nextBoard,
  shownDocument,
  startBoard,
  type Board,
  type BoardEvent,
  type SnapSettings,
} from '@/features/drawing/model/board'
import type { Profile } from '#shared/profile/profile.schema'
import { vector } from '#shared/geometry/vector'

const snap: SnapSettings = { on: true, step: 0.125, angleStep: 15, pitch: 26.565051177, reach: 0.3 }
const loose: SnapSettings = { ...snap, on: false }

const GABLE: Profile = {
  version: 1,
  legs: [4, 5, 0.75],
  bends: [{ turn: -90 }, { turn: 45 }],
  hemA: null,
  hemB: { style: 'closed', length: 0.5, turn: -1 },
  colorSide: 'left',
}

const play = (board: Board, ...events: BoardEvent[]): Board => events.reduce(nextBoard, board)
const press = (x: number, y: number): BoardEvent => ({ type: 'pressSheet', at: vector(x, y), snap })
const move = (x: number, y: number, settings = snap): BoardEvent => ({
  type: 'move',
  at: vector(x, y),
  snap: settings,
})
const lift: BoardEvent = { type: 'lift' }

describe('drawing from nothing', () => {
  test('three presses make a leg, then a bend', () => {
    const board = play(
      startBoard(EMPTY_BOARD),
      press(0, 0),
      lift,
      press(4.05, 0.04),
      lift,
      press(4.02, -5.03),
      lift,
    )
    expect(board.history.present.profile?.legs).toEqual([4, 5])
    expect(board.history.present.profile?.bends).toEqual([{ turn: -90 }])
  })

  test('the first press alone is no profile yet, and can be undone', () => {
    const board = play(startBoard(EMPTY_BOARD), press(0, 0), lift)
    expect(board.history.present.profile).toBeNull()
    expect(cornersOf(board.history.present)).toEqual([vector(0, 0)])
    expect(nextBoard(board, { type: 'undo' }).history.present.started).toBe(false)
  })

  test('a press that slides puts the corner where the finger lifts', () => {
    const board = play(
      startBoard(EMPTY_BOARD),
      press(0, 0),
      lift,
      press(1, 1),
      move(3.02, 0.05),
      lift,
    )
    expect(board.history.present.profile?.legs).toEqual([3])
  })

  test('with edge A in hand the next leg is drawn from there', () => {
    const board = play(
      startBoard(boardOf(GABLE)),
      { type: 'tool', tool: 'draw' },
      { type: 'select', part: { kind: 'edge', edge: 'A' } },
      press(0, -1),
      lift,
    )
    expect(board.history.present.profile?.legs).toEqual([1, 4, 5, 0.75])
    expect(board.history.present.profile?.bends[0]).toEqual({ turn: -90 })
  })
})

describe('dragging a corner', () => {
  const held = nextBoard(startBoard(boardOf(GABLE)), {
    type: 'pressCorner',
    index: 0,
    at: vector(0.1, 0.05),
  })

  test('the corner does not jump to the finger', () => {
    const board = nextBoard(held, move(0.1, 0.05, loose))
    expect(cornersOf(shownDocument(board))[0]).toEqual(vector(0, 0))
  })

  test('is one step of undo, however many moves it took', () => {
    const board = play(held, move(-0.3, 0), move(-0.9, 0.02), move(-0.93, 0.06), lift)
    expect(board.history.present.profile?.legs[0]).toBe(5)
    expect(board.history.past).toHaveLength(1)
    expect(nextBoard(board, { type: 'undo' }).history.present.profile).toEqual(GABLE)
  })

  test('cancelled, it leaves the drawing and the history as they were', () => {
    const board = play(held, move(-2, 1), { type: 'cancel' })
    expect(board.history.present.profile).toBe(GABLE)
    expect(board.history.past).toHaveLength(0)
    expect(board.gesture.kind).toBe('idle')
  })

  test('lifted where it was taken, it is no step', () => {
    expect(nextBoard(held, lift).history.past).toHaveLength(0)
  })

  test('keeps hems, color side and the far turns to the very number', () => {
    const board = play(held, move(-1, 0), lift)
    const profile = board.history.present.profile
    expect(profile?.hemB).toEqual(GABLE.hemB)
    expect(profile?.bends[1]).toEqual(GABLE.bends[1])
  })

  test('a second press while one finger drags is not taken', () => {
    expect(nextBoard(held, { type: 'pressCorner', index: 2, at: vector(4, -5) })).toBe(held)
  })
})

describe('typing a number', () => {
  const leg = (length: number): BoardEvent => ({
    type: 'change',
    document: editProfile(boardOf(GABLE), { kind: 'setLeg', leg: 1, length }),
    typing: 'leg 1',
  })

  test('digit by digit is one step of undo', () => {
    const board = play(startBoard(boardOf(GABLE)), leg(1), leg(12), leg(12.5))
    expect(board.history.present.profile?.legs[0]).toBe(12.5)
    expect(nextBoard(board, { type: 'undo' }).history.present.profile).toEqual(GABLE)
  })

  test('after looking at another part it is a new step', () => {
    const board = play(startBoard(boardOf(GABLE)), leg(1), { type: 'select', part: null }, leg(2))
    expect(board.history.past).toHaveLength(2)
  })
})

describe('corners and legs', () => {
  test('splitting and removing the new corner gives the legs back', () => {
    const split = splitLeg(boardOf(GABLE), 2)
    expect(split.profile?.legs).toHaveLength(4)
    const back = removeCorner(split, 2)
    expect(back.profile?.legs).toEqual(GABLE.legs)
    expect(back.profile?.bends.map(({ turn }) => turn)).toEqual([-90, 45])
  })

  test('removing all corners but one leaves edge A, and then nothing', () => {
    const one = removeCorner(boardOf({ ...GABLE, legs: [4], bends: [] }), 1)
    expect(one.profile).toBeNull()
    expect(cornersOf(one)).toHaveLength(1)
    expect(removeCorner(one, 0)).toEqual(EMPTY_BOARD)
  })

  test('walking from the other edge leaves the picture where it was', () => {
    const before = cornersOf(boardOf(GABLE))
    const after = cornersOf(reverseWalk(boardOf(GABLE))).toReversed()
    after.forEach((corner, index) => {
      expect(corner.x).toBeCloseTo(before[index]?.x ?? NaN, 9)
      expect(corner.y).toBeCloseTo(before[index]?.y ?? NaN, 9)
    })
  })

  test('a selection never outlives its part', () => {
    const board = play(
      startBoard(boardOf(GABLE)),
      { type: 'select', part: { kind: 'leg', leg: 3 } },
      {
        type: 'change',
        document: removeCorner(boardOf(GABLE), 3),
      },
    )
    expect(board.selection).toEqual({ kind: 'leg', leg: 2 })
  })
})
