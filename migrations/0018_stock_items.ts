import type { Knex } from 'knex'

/** What lies in the shop of a stock: coils, stacks of sheets of one size, and drops. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table stock_items (
      id uuid primary key default gen_random_uuid(),
      stock_id uuid not null references stocks,
      kind text not null constraint stock_items_kind_known check (kind in ('coil', 'sheet', 'drop')),
      -- As the mill marks it; sheets and drops keep the lot they were cut from.
      lot text not null check (length(lot) between 1 and 40),
      width double precision not null check (width > 0),
      -- On hand: what is left on a coil, of one sheet or drop else. Inches, as the width.
      length double precision not null check (length > 0),
      count integer not null default 1 check (count > 0),
      film text not null constraint stock_items_film_known check (
        film in ('none', 'painted', 'bare')),
      rack_mark text check (length(rack_mark) between 1 and 20),
      received_on date not null,
      constraint stock_items_only_sheets_are_stacked check (kind = 'sheet' or count = 1),
      constraint stock_items_drops_have_their_place check ((kind = 'drop') = (rack_mark is not null))
    );
    create index stock_items_of_stock on stock_items (stock_id);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table stock_items')
}
