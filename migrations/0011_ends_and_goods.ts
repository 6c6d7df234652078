import type { Knex } from 'knex'

/**
 * The ends of a line's pieces, their hands, the girth that the crew expects, and the small goods of
 * an order. Lines written before have square ends and no hands. An order's event can say that its
 * drawings followed the roof to another pitch.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table order_lines
      add column ends jsonb,
      add column hands jsonb,
      add column stated_girth double precision check (stated_girth > 0);

    alter table orders add column goods jsonb not null default '[]';

    alter table order_events drop constraint order_events_kind_check;
    alter table order_events add constraint order_events_kind_check check (
      kind in ('submitted', 'amended', 'question', 'answered', 'released', 'withdrawn', 'handedOff',
        'redrawn'));
  `)
}

/** What was drawn anew counts as amended where that is not known. */
export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table order_events disable trigger order_events_append_only;
    update order_events set kind = 'amended' where kind = 'redrawn';
    alter table order_events enable trigger order_events_append_only;
    alter table order_events drop constraint order_events_kind_check;
    alter table order_events add constraint order_events_kind_check check (
      kind in ('submitted', 'amended', 'question', 'answered', 'released', 'withdrawn', 'handedOff'));

    alter table orders drop column goods;
    alter table order_lines drop column ends, drop column hands, drop column stated_girth;
  `)
}
