DROP INDEX `ledger_entries_by_account`;--> statement-breakpoint
ALTER TABLE `ledger_entries` ADD `sequence` integer DEFAULT 0 NOT NULL;--> statement-breakpoint
CREATE UNIQUE INDEX `ledger_entries_by_sequence` ON `ledger_entries` (`fabricator_id`,`sequence`);--> statement-breakpoint
CREATE INDEX `ledger_entries_by_account` ON `ledger_entries` (`trade_account_id`,`sequence`);