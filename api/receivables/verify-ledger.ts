import { type SQL, sql } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { reservingStates } from '../orders/reservation';

/** A row that does not say what its sources say. */
export interface Disagreement {
  check: string;
  /** which row: a number, or an identity */
  row: string;
  expected: string | number;
  found: string | number;
}

/** Signed minor units of an account over some entries: debits above zero. */
const posted = (account: string, which: string) =>
  `(select coalesce(sum(p.debit_minor - p.credit_minor), 0) from ledger_entries e join postings p on p.entry_id = e.id where p.account = '${account}' and ${which})`;
const living = 'a.reversed_at is null';
const appliedTo = `(select coalesce(sum(a.amount_minor + a.discount_minor), 0) from allocations a where a.invoice_id = i.id and ${living})`;
const appliedOf = `(select coalesce(sum(a.amount_minor), 0) from allocations a where a.receipt_id = r.id and ${living})`;
const reserving = `(${reservingStates.map((state) => `'${state}'`).join(', ')})`;
/** Whole minor units of an amount in JSON, by the decimals it carries, so that no float decides. */
const minorIn = (json: string) => `cast(replace(${json}, '.', '') as integer)`;

/** Each query answers the rows that disagree as (row, expected, found); what is right answers none. */
const checks: Record<string, string> = {
  'every entry is closed': `select id as row, 1 as expected, closed as found from ledger_entries where closed <> 1`,
  'every entry balances': `select e.id as row, 0 as expected, coalesce(sum(p.debit_minor - p.credit_minor), -1) as found
    from ledger_entries e left join postings p on p.entry_id = e.id group by e.id having found <> 0`,
  'every entry is in one currency, that of its account': `select e.id as row, t.currency as expected, p.currency as found
    from ledger_entries e join postings p on p.entry_id = e.id join trade_accounts t on t.id = e.trade_account_id where p.currency <> t.currency`,
  'the trial balance is zero': `select e.fabricator_id as row, 0 as expected, sum(p.debit_minor - p.credit_minor) as found
    from ledger_entries e join postings p on p.entry_id = e.id group by e.fabricator_id, p.currency having found <> 0`,
  'an entry is reversed by its mirror': `select o.id as row, -(p.debit_minor - p.credit_minor) as expected, coalesce(sum(q.debit_minor - q.credit_minor), 0) as found
    from ledger_entries r join ledger_entries o on o.id = r.reverses join postings p on p.entry_id = o.id
    left join postings q on q.entry_id = r.id and q.account = p.account group by o.id, p.position having found <> expected`,
  'an invoice is posted with its total': `select i.number as row, i.total_minor as expected, ${posted('receivable', "e.document_kind = 'invoice' and e.document_id = i.id")} as found
    from invoices i where found <> expected`,
  'an invoice sums to its total': `select i.number as row, ${minorIn("json_extract(i.totals, '$.total.amount')")} as expected, i.total_minor as found from invoices i where found <> expected
    union all
    select i.number, (select coalesce(sum(json_extract(l.value, '$.unitPriceMinor') * json_extract(l.value, '$.quantity')), 0) from json_each(i.lines) l)
      + (select coalesce(sum(${minorIn("json_extract(c.value, '$.net.amount')")}), 0) from json_each(i.totals, '$.orderCharges') c)
      + (select coalesce(sum(${minorIn("json_extract(x.value, '$.amount.amount')")}), 0) from json_each(i.totals, '$.tax') x) as expected, i.total_minor as found
    from invoices i where found <> expected`,
  'an invoice lacks its total less what was applied': `select i.number as row, i.total_minor - ${appliedTo} as expected, i.open_minor as found from invoices i where found <> expected`,
  'an allocation is posted as it stands': `select a.id as row, case when ${living} then -(a.amount_minor + a.discount_minor) else 0 end as expected,
      ${posted('receivable', "e.document_kind = 'allocation' and e.document_id = a.id")} as found from allocations a where found <> expected`,
  'a receipt is posted as it stands': `select r.number as row, case when r.reversed_at is null then r.amount_minor else 0 end as expected,
      ${posted('bank', "e.document_kind = 'receipt' and e.document_id = r.id")} as found from receipts r where found <> expected`,
  'a receipt has left its amount less what was applied': `select r.number as row, case when r.reversed_at is null then r.amount_minor - ${appliedOf} else 0 end as expected,
      r.unapplied_minor as found from receipts r where found <> expected`,
  'nothing stands of a reversed receipt': `select r.number as row, 0 as expected, ${appliedOf} as found from receipts r where r.reversed_at is not null and found <> 0`,
  'an allocation stays within one account': `select a.id as row, r.trade_account_id as expected, i.trade_account_id as found
    from allocations a join receipts r on r.id = a.receipt_id join invoices i on i.id = a.invoice_id where r.trade_account_id <> i.trade_account_id or r.currency <> i.currency`,
  'the receivable of an account is what its invoices lack': `select t.id as row, (select coalesce(sum(i.open_minor), 0) from invoices i where i.trade_account_id = t.id) as expected,
      ${posted('receivable', 'e.trade_account_id = t.id')} as found from trade_accounts t where found <> expected`,
  'the unapplied cash of an account is what its receipts have left': `select t.id as row, (select coalesce(sum(r.unapplied_minor), 0) from receipts r where r.trade_account_id = t.id) as expected,
      -${posted('unapplied cash', 'e.trade_account_id = t.id')} as found from trade_accounts t where found <> expected`,
  'the kept receivable is the ledger’s': `select b.trade_account_id as row, ${posted('receivable', 'e.trade_account_id = b.trade_account_id')} as expected, b.receivable_minor as found
    from account_balances b where found <> expected`,
  'the kept unapplied cash is the ledger’s': `select b.trade_account_id as row, -${posted('unapplied cash', 'e.trade_account_id = b.trade_account_id')} as expected, b.unapplied_minor as found
    from account_balances b where found <> expected`,
  'the kept reservation is the orders’': `select t.id as row, case when t.counts_from = 'dispatch' then 0 else (select coalesce(sum(o.total_minor - o.invoiced_minor), 0)
      from orders o where o.trade_account_id = t.id and o.payment = 'account' and o.state in ${reserving}) end as expected, coalesce(b.reserved_minor, -1) as found
    from trade_accounts t left join account_balances b on b.trade_account_id = t.id where found <> expected`,
  'an order’s total is that of its sums': `select o.number as row, ${minorIn("json_extract(o.totals, '$.total.amount')")} as expected, o.total_minor as found from orders o where found <> expected`,
  'an order is invoiced for what its invoices say': `select o.number as row, (select coalesce(sum(i.total_minor), 0) from invoices i where i.order_id = o.id) as expected,
      o.invoiced_minor as found from orders o where found <> expected`,
  'an order that is out is invoiced whole': `select o.number as row, o.total_minor as expected, o.invoiced_minor as found from orders o
    where (o.dispatched_units = o.units or o.state in ('dispatched', 'delivered', 'closed')) and found <> expected`,
  'a line is out by its dispatches': `select l.id as row, (select coalesce(sum(d.quantity), 0) from dispatch_lines d where d.order_line_id = l.id) as expected, l.dispatched as found
    from order_lines l where found <> expected`,
  'an order’s units are its lines’': `select o.number as row, coalesce(sum(l.quantity), 0) as expected, o.units as found from orders o left join order_lines l on l.order_id = o.id
    group by o.id having found <> expected
    union all
    select o.number, coalesce(sum(l.dispatched), 0) as expected, o.dispatched_units as found from orders o left join order_lines l on l.order_id = o.id group by o.id having found <> expected`,
  'every dispatch has its invoice': `select d.number as row, 1 as expected, count(i.id) as found from dispatches d left join invoices i on i.dispatch_id = d.id group by d.id having found <> 1`,
};

/** Numbers that may have no gaps: as many as were given out, each once, the last the highest. */
const series: Record<string, { kind: string; numbers: string }> = {
  invoices: { kind: 'invoice', numbers: 'select fabricator_id as company, sequence as n from invoices' },
  entries: { kind: 'entry', numbers: 'select fabricator_id as company, sequence as n from ledger_entries' },
  receipts: { kind: 'receipt', numbers: `select fabricator_id as company, ${numberAfter('REC')} as n from receipts` },
  orders: { kind: 'order', numbers: `select fabricator_id as company, ${numberAfter('-')} as n from orders` },
  dispatches: {
    kind: 'dispatch',
    numbers: `select o.fabricator_id as company, ${numberAfter('DIS', 'd.number')} as n from dispatches d join orders o on o.id = d.order_id`,
  },
};

function numberAfter(mark: string, column = 'number'): string {
  return `cast(substr(${column}, instr(${column}, '${mark}') + ${mark.length}) as integer)`;
}

/** Both sides in words, such as `1 to 7, 7 in all`. */
const gaps = ({ kind, numbers }: { kind: string; numbers: string }) => `
  select s.company_id as row, '1 to ' || (s.next - 1) || ', ' || (s.next - 1) || ' in all' as expected,
      min(x.n) || ' to ' || max(x.n) || ', ' || count(distinct x.n) || ' in all' as found
    from number_series s left join (${numbers}) x on x.company = s.company_id
    where s.kind = '${kind}' group by s.company_id having found is not expected
  union all
  select x.company, 'none', 'up to ' || max(x.n) from (${numbers}) x
    where not exists (select 1 from number_series s where s.company_id = x.company and s.kind = '${kind}') group by x.company`;

const queries = new Map([
  ...Object.entries(checks),
  ...Object.entries(series).map(([what, one]) => [`numbers of ${what} have no gap`, gaps(one)] as const),
]);

/** What is checked, by name. */
export const ledgerChecks: readonly string[] = [...queries.keys()];

/**
 * Works out from nothing what every balance, open amount and number series has to be, and
 * compares: of each check the first row that disagrees. Nothing: the books are right.
 */
export function verifyLedger(db: Db): Disagreement[] {
  return [...queries].flatMap(([check, query]) => {
    const first = db.get<Omit<Disagreement, 'check'> | undefined>(raw(`select * from (${query}) limit 1`));
    return first ? [{ check, ...first }] : [];
  });
}

const raw = (text: string): SQL => sql.raw(text);
