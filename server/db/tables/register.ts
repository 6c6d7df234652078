import type { Knex } from 'knex'
import type { AuditLogInsert, AuditLogRow } from './audit-log'
import type { BrakeInsert, BrakeRow, BrakeUpdate } from './brakes'
import type { BundleInsert, BundleRow, BundleUpdate } from './bundles'
import type { CalibrationInsert, CalibrationRow } from './calibrations'
import type { CompanyInsert, CompanyRow, CompanyUpdate } from './companies'
import type { HandOffInsert, HandOffRow } from './hand-offs'
import type {
  IdempotencyKeyInsert,
  IdempotencyKeyRow,
  IdempotencyKeyUpdate,
} from './idempotency-keys'
import type { JobInsert, JobRow, JobUpdate } from './jobs'
import type {
  LabelPrintInsert,
  LabelPrintPieceInsert,
  LabelPrintPieceRow,
  LabelPrintRow,
} from './label-prints'
import type { LiveEventInsert, LiveEventRow } from './live-events'
import type {
  MailAttachmentInsert,
  MailAttachmentRow,
  MailInsert,
  MailRow,
  MailUpdate,
  SlipInsert,
  SlipRow,
} from './mails'
import type { OrderEventInsert, OrderEventRow } from './order-events'
import type { OrderLineInsert, OrderLineRow, OrderLineUpdate } from './order-lines'
import type { OrderStateRow } from './order-states'
import type { OrderInsert, OrderRow, OrderUpdate } from './orders'
import type { PasswordLinkInsert, PasswordLinkRow } from './password-links'
import type { PersonInsert, PersonTableRow, PersonUpdate } from './people'
import type {
  PieceEventInsert,
  PieceEventRow,
  PieceInsert,
  PieceMoveRow,
  PieceRow,
  PieceUpdate,
} from './pieces'
import type { PlanCacheInsert, PlanCacheRow, PlanCacheUpdate } from './plan-cache'
import type { PriceBookInsert, PriceBookRow } from './price-books'
import type { RateLimitRow } from './rate-limits'
import type { RunInsert, RunRow, RunUpdate } from './runs'
import type { SessionRow } from './sessions'
import type { ShelfProfileInsert, ShelfProfileRow, ShelfProfileUpdate } from './shelf-profiles'
import type { StockItemInsert, StockItemRow } from './stock-items'
import type { ShelfVersionRow } from './shelf-versions'
import type { StockInsert, StockRow, StockUpdate } from './stocks'
import type { TestBendInsert, TestBendRow, TestBendUpdate } from './test-bends'

/** Knex itself checks table and column names against these types. */
declare module 'knex/types/tables' {
  interface Tables {
    companies: Knex.CompositeTableType<CompanyRow, CompanyInsert, CompanyUpdate>
    people: Knex.CompositeTableType<PersonTableRow, PersonInsert, PersonUpdate>
    sessions: SessionRow
    rate_limits: RateLimitRow
    idempotency_keys: Knex.CompositeTableType<
      IdempotencyKeyRow,
      IdempotencyKeyInsert,
      IdempotencyKeyUpdate
    >
    live_events: Knex.CompositeTableType<LiveEventRow, LiveEventInsert>
    stocks: Knex.CompositeTableType<StockRow, StockInsert, StockUpdate>
    stock_items: Knex.CompositeTableType<StockItemRow, StockItemInsert>
    price_books: Knex.CompositeTableType<PriceBookRow, PriceBookInsert>
    test_bends: Knex.CompositeTableType<TestBendRow, TestBendInsert, TestBendUpdate>
    calibrations: Knex.CompositeTableType<CalibrationRow, CalibrationInsert>
    brakes: Knex.CompositeTableType<BrakeRow, BrakeInsert, BrakeUpdate>
    jobs: Knex.CompositeTableType<JobRow, JobInsert, JobUpdate>
    shelf_profiles: Knex.CompositeTableType<ShelfProfileRow, ShelfProfileInsert, ShelfProfileUpdate>
    shelf_versions: ShelfVersionRow
    orders: Knex.CompositeTableType<OrderRow, OrderInsert, OrderUpdate>
    order_lines: Knex.CompositeTableType<OrderLineRow, OrderLineInsert, OrderLineUpdate>
    order_events: Knex.CompositeTableType<OrderEventRow, OrderEventInsert>
    order_states: OrderStateRow
    runs: Knex.CompositeTableType<RunRow, RunInsert, RunUpdate>
    bundles: Knex.CompositeTableType<BundleRow, BundleInsert, BundleUpdate>
    hand_offs: Knex.CompositeTableType<HandOffRow, HandOffInsert>
    pieces: Knex.CompositeTableType<PieceRow, PieceInsert, PieceUpdate>
    piece_events: Knex.CompositeTableType<PieceEventRow, PieceEventInsert>
    piece_moves: PieceMoveRow
    label_prints: Knex.CompositeTableType<LabelPrintRow, LabelPrintInsert>
    label_print_pieces: Knex.CompositeTableType<LabelPrintPieceRow, LabelPrintPieceInsert>
    mails: Knex.CompositeTableType<MailRow, MailInsert, MailUpdate>
    mail_attachments: Knex.CompositeTableType<MailAttachmentRow, MailAttachmentInsert>
    slips: Knex.CompositeTableType<SlipRow, SlipInsert>
    password_links: Knex.CompositeTableType<PasswordLinkRow, PasswordLinkInsert>
    audit_log: Knex.CompositeTableType<AuditLogRow, AuditLogInsert>
    plan_cache: Knex.CompositeTableType<PlanCacheRow, PlanCacheInsert, PlanCacheUpdate>
  }
}
