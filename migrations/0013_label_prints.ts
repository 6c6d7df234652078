import type { Knex } from 'knex'

/** Who printed which labels, and when; a piece may get its label more than once. Never changed. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table label_prints (
      id uuid primary key default gen_random_uuid(),
      paper text not null constraint label_prints_paper_known check (
        paper in ('roll4x2', 'letter', 'a4')),
      person_id uuid not null references people,
      at timestamptz not null default clock_timestamp()
    );

    create table label_print_pieces (
      print_id uuid not null references label_prints,
      -- The label's place in the print, from 1.
      position integer not null check (position > 0),
      piece_id uuid not null references pieces,
      -- Whether the piece had a label before.
      reprinted boolean not null,
      primary key (print_id, position),
      constraint label_print_pieces_once unique (print_id, piece_id)
    );
    create index label_print_pieces_of_piece on label_print_pieces (piece_id);

    create trigger label_prints_append_only before update or delete on label_prints
      for each row execute function refuse_change();
    create trigger label_prints_no_truncate before truncate on label_prints
      for each statement execute function refuse_change();
    create trigger label_print_pieces_append_only before update or delete on label_print_pieces
      for each row execute function refuse_change();
    create trigger label_print_pieces_no_truncate before truncate on label_print_pieces
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table label_print_pieces; drop table label_prints')
}
