import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { PIECE_EVENTS, PIECES } from '#server/db/tables/pieces'
import { RUNS } from '#server/db/tables/runs'
import { createReleaseStore, type ReleaseStore } from '#server/features/orders/release.store'
import type { DemoRandom } from './demo-random'

/** Writes what a release makes, with codes and times of the demo shop. */
export function createDemoReleaseStore(db: Db, random: DemoRandom, clock: Clock): ReleaseStore {
  return {
    ...createReleaseStore(db),

    createRuns: async (orderId, runs) => {
      await db(RUNS).insert(
        runs.map(({ id, lines: [first], stock, strip, brake, plan, override }) => ({
          id,
          code: random.drawCode('run'),
          order_id: orderId,
          brake_id: brake.id,
          name: first.name,
          profile: JSON.stringify(first.profile),
          stock: JSON.stringify(stock),
          strip: JSON.stringify(strip),
          brake: JSON.stringify(brake.brake),
          plan: JSON.stringify(plan),
          override: override && JSON.stringify(override),
          created_at: clock.now(),
        })),
      )
    },

    createPieces: async (orderId, pieces, personId) => {
      const rows = pieces.map(({ lineId, runId, sequence }) => ({
        id: random.nextId(),
        code: random.drawCode('piece'),
        order_id: orderId,
        line_id: lineId,
        run_id: runId,
        sequence,
      }))
      await db(PIECES).insert(rows)
      await db(PIECE_EVENTS).insert(
        rows.map(({ id }) => ({
          piece_id: id,
          from_state: null,
          to_state: 'queued' as const,
          person_id: personId,
          station: 'counter' as const,
          at: clock.now(),
        })),
      )
    },
  }
}
