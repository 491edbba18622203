DROP INDEX `orders_by_number_text`;--> statement-breakpoint
DROP INDEX `orders_of_dealer_by_po`;--> statement-breakpoint
DROP INDEX `orders_of_fabricator_by_po`;--> statement-breakpoint
DROP INDEX `orders_of_account`;--> statement-breakpoint
CREATE INDEX `orders_of_dealer_by_number` ON `orders` (`dealer_id`,`number`,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_dealer_by_po` ON `orders` (`dealer_id`,"po_number" collate nocase,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_fabricator_by_po` ON `orders` (`fabricator_id`,"po_number" collate nocase,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_account` ON `orders` (`trade_account_id`,`placed_at`,`id`);--> statement-breakpoint
DROP INDEX `invoices_open_of_account`;--> statement-breakpoint
CREATE INDEX `invoices_of_account` ON `invoices` (`trade_account_id`,`due_on`,`id`);--> statement-breakpoint
CREATE INDEX `invoices_of_dealer_by_number` ON `invoices` (`dealer_id`,`number`,`id`);--> statement-breakpoint
CREATE INDEX `invoices_of_dealer_by_reference` ON `invoices` (`dealer_id`,`reference`,`id`);--> statement-breakpoint
CREATE INDEX `invoices_open_of_account` ON `invoices` (`trade_account_id`,`due_on`,`id`) WHERE open_minor > 0;--> statement-breakpoint
CREATE INDEX `receipts_unapplied` ON `receipts` (`fabricator_id`,`recorded_at`,`id`) WHERE unapplied_minor > 0;