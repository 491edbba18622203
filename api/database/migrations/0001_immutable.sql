-- What is posted, published or recorded never changes.
CREATE TRIGGER `ledger_entries_balance` BEFORE UPDATE OF `closed` ON `ledger_entries` WHEN NEW.closed = 1 AND OLD.closed = 0
BEGIN
  SELECT RAISE(ABORT, 'a ledger entry must balance')
  WHERE (SELECT coalesce(sum(debit_minor - credit_minor), -1) FROM postings WHERE entry_id = NEW.id) <> 0
     OR (SELECT count(DISTINCT currency) FROM postings WHERE entry_id = NEW.id) <> 1;
END;
--> statement-breakpoint
CREATE TRIGGER `ledger_entries_keep` BEFORE UPDATE ON `ledger_entries` WHEN OLD.closed = 1
BEGIN SELECT RAISE(ABORT, 'a posted ledger entry cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `ledger_entries_stay` BEFORE DELETE ON `ledger_entries`
BEGIN SELECT RAISE(ABORT, 'a ledger entry cannot be deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `postings_open_only` BEFORE INSERT ON `postings`
WHEN (SELECT closed FROM ledger_entries WHERE id = NEW.entry_id) = 1
BEGIN SELECT RAISE(ABORT, 'a posted ledger entry takes no more postings'); END;
--> statement-breakpoint
CREATE TRIGGER `postings_keep` BEFORE UPDATE ON `postings`
BEGIN SELECT RAISE(ABORT, 'a posting cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `postings_stay` BEFORE DELETE ON `postings`
BEGIN SELECT RAISE(ABORT, 'a posting cannot be deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `price_list_versions_keep` BEFORE UPDATE ON `price_list_versions` WHEN OLD.state = 'published'
BEGIN SELECT RAISE(ABORT, 'a published price list version cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `price_list_versions_stay` BEFORE DELETE ON `price_list_versions` WHEN OLD.state = 'published'
BEGIN SELECT RAISE(ABORT, 'a published price list version cannot be deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `invoices_keep` BEFORE UPDATE OF `id`, `number`, `sequence`, `reference`, `fabricator_id`, `dealer_id`, `trade_account_id`, `order_id`, `dispatch_id`, `issued_on`, `issued_at`, `due_on`, `discount_percent`, `discount_until`, `currency`, `lines`, `totals`, `total_minor` ON `invoices`
BEGIN SELECT RAISE(ABORT, 'an issued invoice cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `invoices_stay` BEFORE DELETE ON `invoices`
BEGIN SELECT RAISE(ABORT, 'an issued invoice cannot be deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `order_moves_keep` BEFORE UPDATE ON `order_moves`
BEGIN SELECT RAISE(ABORT, 'a recorded move cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `order_moves_stay` BEFORE DELETE ON `order_moves`
BEGIN SELECT RAISE(ABORT, 'a recorded move cannot be deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `audit_rows_keep` BEFORE UPDATE ON `audit_rows`
BEGIN SELECT RAISE(ABORT, 'an audit row cannot be changed'); END;
--> statement-breakpoint
CREATE TRIGGER `audit_rows_stay` BEFORE DELETE ON `audit_rows`
BEGIN SELECT RAISE(ABORT, 'an audit row cannot be deleted'); END;
