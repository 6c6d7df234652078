import type { Knex } from 'knex'

/** An order's state and its counts, derived from events and pieces wherever they are asked for. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create view order_states as
    select
      o.id as order_id,
      ordered.piece_count,
      counts.queued,
      counts.bent,
      counts.bundled,
      counts.picked_up,
      counts.scrapped,
      counts.withdrawn,
      case
        when o.withdrawn_at is not null then 'withdrawn'
        when o.released_at is null then
          case when talk.kind = 'question' then 'question' else 'submitted' end
        when counts.living = 0 then 'withdrawn'
        when counts.picked_up = counts.living then 'pickedUp'
        when counts.picked_up > 0 then 'partPickedUp'
        when counts.bundled = counts.living then 'ready'
        when counts.queued = counts.living then 'released'
        else 'inWork'
      end as state
    from orders o
    cross join lateral (
      select coalesce(sum(quantity), 0)::integer as piece_count from order_lines where order_id = o.id
    ) ordered
    cross join lateral (
      select
        (count(*) filter (where state = 'queued'))::integer as queued,
        (count(*) filter (where state = 'bent'))::integer as bent,
        (count(*) filter (where state = 'bundled'))::integer as bundled,
        (count(*) filter (where state = 'pickedUp'))::integer as picked_up,
        (count(*) filter (where state = 'scrapped'))::integer as scrapped,
        (count(*) filter (where state = 'withdrawn'))::integer as withdrawn,
        (count(*) filter (where state not in ('scrapped', 'withdrawn')))::integer as living
      from pieces where order_id = o.id
    ) counts
    left join lateral (
      select kind from order_events
      where order_id = o.id and kind in ('submitted', 'amended', 'question', 'answered')
      order by id desc limit 1
    ) talk on true
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop view order_states')
}
