/**
 * What each brake bent last: the run of its newest event by which a piece was bent that is not
 * queued again since. The beginning of a statement that joins `last_bent` by `brake_id`.
 */
export const LAST_BENT = `
  with last_bent as materialized (
    select b.id as brake_id, newest.run_id, newest.stock_id
    from brakes b
    cross join lateral (
      select done.id as run_id, done.stock ->> 'id' as stock_id
      from piece_events e
      join pieces p on p.id = e.piece_id
      join runs done on done.id = p.run_id
      where done.brake_id = b.id and e.from_state = 'queued' and e.to_state = 'bent'
        and p.state <> 'queued'
      order by e.id desc limit 1
    ) newest
  )`
