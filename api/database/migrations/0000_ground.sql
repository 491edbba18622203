CREATE TABLE `account_balances` (
	`trade_account_id` text PRIMARY KEY NOT NULL,
	`receivable_minor` integer NOT NULL,
	`unapplied_minor` integer NOT NULL,
	`reserved_minor` integer NOT NULL,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "account_balances_unapplied" CHECK("account_balances"."unapplied_minor" >= 0),
	CONSTRAINT "account_balances_reserved" CHECK("account_balances"."reserved_minor" >= 0)
) STRICT;
--> statement-breakpoint
CREATE TABLE `addresses` (
	`id` text PRIMARY KEY NOT NULL,
	`company_id` text NOT NULL,
	`label` text NOT NULL,
	`lines` text NOT NULL,
	`town` text NOT NULL,
	`region` text NOT NULL,
	`postcode` text NOT NULL,
	`country` text NOT NULL,
	`jurisdiction` text NOT NULL,
	`zone` text NOT NULL,
	`altitude_m` real,
	`position` integer NOT NULL,
	FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `addresses_by_company` ON `addresses` (`company_id`,`position`);--> statement-breakpoint
CREATE TABLE `audit_rows` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`company_id` text NOT NULL,
	`person_id` text,
	`at` integer NOT NULL,
	`action` text NOT NULL,
	`subject_kind` text NOT NULL,
	`subject_id` text NOT NULL,
	`before` text,
	`after` text,
	`reason` text
) STRICT;
--> statement-breakpoint
CREATE INDEX `audit_rows_by_company` ON `audit_rows` (`company_id`,`id`);--> statement-breakpoint
CREATE INDEX `audit_rows_by_subject` ON `audit_rows` (`subject_kind`,`subject_id`);--> statement-breakpoint
CREATE TABLE `companies` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`name` text NOT NULL,
	`town` text NOT NULL,
	`country` text NOT NULL,
	`email_domain` text NOT NULL,
	`measure_system` text NOT NULL,
	`time_zone` text NOT NULL,
	`locale` text NOT NULL,
	`letterhead` text NOT NULL,
	`created_at` integer NOT NULL,
	CONSTRAINT "companies_kind" CHECK("companies"."kind" in ('dealer', 'fabricator', 'market')),
	CONSTRAINT "companies_measure_system" CHECK("companies"."measure_system" in ('imperial', 'metric'))
) STRICT;
--> statement-breakpoint
CREATE INDEX `companies_by_name` ON `companies` (`name`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `companies_by_domain` ON `companies` (`email_domain`);--> statement-breakpoint
CREATE TABLE `exemption_certificates` (
	`id` text PRIMARY KEY NOT NULL,
	`dealer_id` text NOT NULL,
	`jurisdiction` text NOT NULL,
	`certificate` text NOT NULL,
	`valid_from` text NOT NULL,
	`valid_until` text NOT NULL,
	FOREIGN KEY (`dealer_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "exemption_certificates_from" CHECK("exemption_certificates"."valid_from" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'),
	CONSTRAINT "exemption_certificates_until" CHECK("exemption_certificates"."valid_until" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]')
) STRICT;
--> statement-breakpoint
CREATE INDEX `exemption_certificates_by_dealer` ON `exemption_certificates` (`dealer_id`,`jurisdiction`);--> statement-breakpoint
CREATE TABLE `fabricators` (
	`company_id` text PRIMARY KEY NOT NULL,
	`about` text NOT NULL,
	`plant_altitude_m` real NOT NULL,
	`capabilities` text NOT NULL,
	`calendar` text NOT NULL,
	`number_prefix` text NOT NULL,
	`takes_cards` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`company_id` text NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`active` integer DEFAULT true NOT NULL,
	`order_limit_minor` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `people_by_email` ON `people` (lower("email"));--> statement-breakpoint
CREATE INDEX `people_by_company` ON `people` (`company_id`);--> statement-breakpoint
CREATE TABLE `person_roles` (
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`person_id`, `role`),
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "person_roles_role" CHECK("person_roles"."role" in ('buyer', 'dealer-admin', 'sales', 'accounts', 'plant', 'fabricator-admin', 'operator'))
) STRICT;
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`started_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`revoked_at` integer,
	`user_agent` text NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `sessions_by_person` ON `sessions` (`person_id`,`expires_at`);--> statement-breakpoint
CREATE TABLE `trade_accounts` (
	`id` text PRIMARY KEY NOT NULL,
	`dealer_id` text NOT NULL,
	`fabricator_id` text NOT NULL,
	`currency` text NOT NULL,
	`state` text NOT NULL,
	`tier` text NOT NULL,
	`terms` text NOT NULL,
	`limit_minor` integer NOT NULL,
	`counts_from` text NOT NULL,
	`on_hold` integer NOT NULL,
	`grace_days` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`dealer_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "trade_accounts_state" CHECK("trade_accounts"."state" in ('open', 'closed')),
	CONSTRAINT "trade_accounts_counts_from" CHECK("trade_accounts"."counts_from" in ('placement', 'dispatch')),
	CONSTRAINT "trade_accounts_currency" CHECK("trade_accounts"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "trade_accounts_limit" CHECK("trade_accounts"."limit_minor" >= 0)
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `trade_accounts_by_dealer` ON `trade_accounts` (`dealer_id`,`fabricator_id`);--> statement-breakpoint
CREATE INDEX `trade_accounts_by_fabricator` ON `trade_accounts` (`fabricator_id`,`id`);--> statement-breakpoint
CREATE TABLE `outbox_mails` (
	`id` text PRIMARY KEY NOT NULL,
	`company_id` text NOT NULL,
	`message_id` text NOT NULL,
	`from_name` text NOT NULL,
	`reply_to` text NOT NULL,
	`to_address` text NOT NULL,
	`subject` text NOT NULL,
	`body` text NOT NULL,
	`attachments` text NOT NULL,
	`subject_kind` text NOT NULL,
	`subject_id` text NOT NULL,
	`state` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	`last_error` text,
	FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "outbox_mails_state" CHECK("outbox_mails"."state" in ('waiting', 'sent', 'failed'))
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_mails_by_message` ON `outbox_mails` (`message_id`);--> statement-breakpoint
CREATE INDEX `outbox_mails_due` ON `outbox_mails` (`state`,`next_attempt_at`);--> statement-breakpoint
CREATE INDEX `outbox_mails_by_subject` ON `outbox_mails` (`subject_kind`,`subject_id`);--> statement-breakpoint
CREATE TABLE `dispatch_lines` (
	`dispatch_id` text NOT NULL,
	`order_line_id` text NOT NULL,
	`quantity` integer NOT NULL,
	PRIMARY KEY(`dispatch_id`, `order_line_id`),
	FOREIGN KEY (`dispatch_id`) REFERENCES `dispatches`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`order_line_id`) REFERENCES `order_lines`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "dispatch_lines_quantity" CHECK("dispatch_lines"."quantity" > 0)
) STRICT;
--> statement-breakpoint
CREATE TABLE `dispatches` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`number` text NOT NULL,
	`at` integer NOT NULL,
	`person_id` text NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `dispatches_by_order` ON `dispatches` (`order_id`,`at`);--> statement-breakpoint
CREATE TABLE `idempotency_keys` (
	`person_id` text NOT NULL,
	`key` text NOT NULL,
	`endpoint` text NOT NULL,
	`request_hash` text NOT NULL,
	`subject_id` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`person_id`, `key`)
) STRICT;
--> statement-breakpoint
CREATE TABLE `order_lines` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`position` integer NOT NULL,
	`tag` text,
	`unit` text NOT NULL,
	`make_up` text NOT NULL,
	`quantity` integer NOT NULL,
	`dispatched` integer DEFAULT 0 NOT NULL,
	`unit_price_minor` integer NOT NULL,
	`line_price_minor` integer NOT NULL,
	`sheet` text NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "order_lines_dispatched" CHECK("order_lines"."dispatched" between 0 and "order_lines"."quantity")
) STRICT;
--> statement-breakpoint
CREATE INDEX `order_lines_by_order` ON `order_lines` (`order_id`,`position`);--> statement-breakpoint
CREATE TABLE `order_moves` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`order_id` text NOT NULL,
	`from_state` text,
	`to_state` text NOT NULL,
	`at` integer NOT NULL,
	`person_id` text,
	`reason` text,
	FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `order_moves_by_order` ON `order_moves` (`order_id`,`id`);--> statement-breakpoint
CREATE TABLE `orders` (
	`id` text PRIMARY KEY NOT NULL,
	`number` text NOT NULL,
	`dealer_id` text NOT NULL,
	`fabricator_id` text NOT NULL,
	`trade_account_id` text NOT NULL,
	`quote_id` text,
	`state` text NOT NULL,
	`po_number` text NOT NULL,
	`payment` text NOT NULL,
	`currency` text NOT NULL,
	`ship_to` text NOT NULL,
	`destination` text NOT NULL,
	`required_on` text,
	`promised_on` text,
	`price_list_version_id` text NOT NULL,
	`totals` text NOT NULL,
	`total_minor` integer NOT NULL,
	`invoiced_minor` integer DEFAULT 0 NOT NULL,
	`units` integer NOT NULL,
	`dispatched_units` integer DEFAULT 0 NOT NULL,
	`placed_at` integer NOT NULL,
	`placed_by` text NOT NULL,
	FOREIGN KEY (`dealer_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`quote_id`) REFERENCES `quotes`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`price_list_version_id`) REFERENCES `price_list_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`placed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "orders_state" CHECK("orders"."state" in ('awaiting approval', 'credit review', 'awaiting payment', 'submitted', 'accepted', 'in production', 'ready', 'dispatched', 'delivered', 'closed', 'cancelled', 'refused')),
	CONSTRAINT "orders_payment" CHECK("orders"."payment" in ('account', 'card')),
	CONSTRAINT "orders_currency" CHECK("orders"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "orders_total" CHECK("orders"."total_minor" >= 0),
	CONSTRAINT "orders_dispatched" CHECK("orders"."dispatched_units" between 0 and "orders"."units")
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `orders_by_number` ON `orders` (`fabricator_id`,`number`);--> statement-breakpoint
CREATE INDEX `orders_by_number_text` ON `orders` ("number" collate nocase);--> statement-breakpoint
CREATE INDEX `orders_of_dealer` ON `orders` (`dealer_id`,`placed_at`,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_fabricator` ON `orders` (`fabricator_id`,`placed_at`,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_dealer_by_state` ON `orders` (`dealer_id`,`state`,`placed_at`,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_fabricator_by_state` ON `orders` (`fabricator_id`,`state`,`placed_at`,`id`);--> statement-breakpoint
CREATE INDEX `orders_of_dealer_by_po` ON `orders` (`dealer_id`,"po_number" collate nocase);--> statement-breakpoint
CREATE INDEX `orders_of_fabricator_by_po` ON `orders` (`fabricator_id`,"po_number" collate nocase);--> statement-breakpoint
CREATE INDEX `orders_of_account` ON `orders` (`trade_account_id`,`state`);--> statement-breakpoint
CREATE UNIQUE INDEX `orders_by_quote` ON `orders` (`quote_id`);--> statement-breakpoint
CREATE TABLE `catalogue_items` (
	`part` text NOT NULL,
	`id` text NOT NULL,
	`position` integer NOT NULL,
	`data` text NOT NULL,
	PRIMARY KEY(`part`, `id`),
	CONSTRAINT "catalogue_items_part" CHECK("catalogue_items"."part" in ('glasses', 'treatments', 'coatings', 'spacers', 'gases', 'grids', 'shapes', 'edgeWork'))
) STRICT;
--> statement-breakpoint
CREATE TABLE `contract_prices` (
	`id` text PRIMARY KEY NOT NULL,
	`trade_account_id` text NOT NULL,
	`agreed` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `contract_prices_by_account` ON `contract_prices` (`trade_account_id`);--> statement-breakpoint
CREATE TABLE `price_list_versions` (
	`id` text PRIMARY KEY NOT NULL,
	`list_id` text NOT NULL,
	`number` integer NOT NULL,
	`state` text NOT NULL,
	`content` text NOT NULL,
	`effective_from` integer,
	`published_at` integer,
	`created_at` integer NOT NULL,
	`created_by` text,
	`reason` text NOT NULL,
	FOREIGN KEY (`list_id`) REFERENCES `price_lists`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "price_list_versions_state" CHECK("price_list_versions"."state" in ('draft', 'published')),
	CONSTRAINT "price_list_versions_published" CHECK(("price_list_versions"."state" = 'published') = ("price_list_versions"."effective_from" is not null))
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `price_list_versions_by_number` ON `price_list_versions` (`list_id`,`number`);--> statement-breakpoint
CREATE INDEX `price_list_versions_in_force` ON `price_list_versions` (`list_id`,`state`,`effective_from`);--> statement-breakpoint
CREATE TABLE `price_lists` (
	`id` text PRIMARY KEY NOT NULL,
	`fabricator_id` text NOT NULL,
	`name` text NOT NULL,
	`currency` text NOT NULL,
	`measure` text NOT NULL,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "price_lists_currency" CHECK("price_lists"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD'))
) STRICT;
--> statement-breakpoint
CREATE INDEX `price_lists_by_fabricator` ON `price_lists` (`fabricator_id`);--> statement-breakpoint
CREATE TABLE `promotions` (
	`id` text PRIMARY KEY NOT NULL,
	`fabricator_id` text NOT NULL,
	`offered` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `promotions_by_fabricator` ON `promotions` (`fabricator_id`);--> statement-breakpoint
CREATE TABLE `quote_lines` (
	`id` text PRIMARY KEY NOT NULL,
	`quote_id` text NOT NULL,
	`position` integer NOT NULL,
	`tag` text,
	`unit` text NOT NULL,
	`quantity` integer NOT NULL,
	`extras` text NOT NULL,
	`make_up` text NOT NULL,
	`unit_price_minor` integer NOT NULL,
	`line_price_minor` integer NOT NULL,
	`sheet` text NOT NULL,
	FOREIGN KEY (`quote_id`) REFERENCES `quotes`(`id`) ON UPDATE no action ON DELETE cascade
) STRICT;
--> statement-breakpoint
CREATE INDEX `quote_lines_by_quote` ON `quote_lines` (`quote_id`,`position`);--> statement-breakpoint
CREATE TABLE `quotes` (
	`id` text PRIMARY KEY NOT NULL,
	`number` text NOT NULL,
	`dealer_id` text NOT NULL,
	`fabricator_id` text NOT NULL,
	`trade_account_id` text NOT NULL,
	`state` text NOT NULL,
	`currency` text NOT NULL,
	`customer` text,
	`customer_name` text DEFAULT '' NOT NULL,
	`mark_up_percent` text NOT NULL,
	`notes` text NOT NULL,
	`valid_until` text NOT NULL,
	`ship_to_id` text,
	`lead_time_class` text,
	`lead_time_days` integer,
	`price_list_version_id` text NOT NULL,
	`terms` text NOT NULL,
	`destination` text NOT NULL,
	`priced_at` integer NOT NULL,
	`totals` text NOT NULL,
	`total_minor` integer NOT NULL,
	`units` integer NOT NULL,
	`revision` integer NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`created_by` text NOT NULL,
	FOREIGN KEY (`dealer_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`ship_to_id`) REFERENCES `addresses`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`price_list_version_id`) REFERENCES `price_list_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "quotes_state" CHECK("quotes"."state" in ('open', 'ordered')),
	CONSTRAINT "quotes_currency" CHECK("quotes"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "quotes_valid_until" CHECK("quotes"."valid_until" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]')
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `quotes_by_number` ON `quotes` (`dealer_id`,`number`);--> statement-breakpoint
CREATE INDEX `quotes_newest` ON `quotes` (`dealer_id`,`created_at`,`id`);--> statement-breakpoint
CREATE INDEX `quotes_by_state` ON `quotes` (`dealer_id`,`state`,`created_at`,`id`);--> statement-breakpoint
CREATE TABLE `allocations` (
	`id` text PRIMARY KEY NOT NULL,
	`receipt_id` text NOT NULL,
	`invoice_id` text NOT NULL,
	`amount_minor` integer NOT NULL,
	`discount_minor` integer NOT NULL,
	`at` integer NOT NULL,
	`person_id` text NOT NULL,
	`reversed_at` integer,
	`reversed_reason` text,
	FOREIGN KEY (`receipt_id`) REFERENCES `receipts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`invoice_id`) REFERENCES `invoices`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "allocations_amount" CHECK("allocations"."amount_minor" >= 0),
	CONSTRAINT "allocations_discount" CHECK("allocations"."discount_minor" >= 0)
) STRICT;
--> statement-breakpoint
CREATE INDEX `allocations_by_invoice` ON `allocations` (`invoice_id`);--> statement-breakpoint
CREATE INDEX `allocations_by_receipt` ON `allocations` (`receipt_id`);--> statement-breakpoint
CREATE TABLE `invoices` (
	`id` text PRIMARY KEY NOT NULL,
	`number` text NOT NULL,
	`sequence` integer NOT NULL,
	`reference` text NOT NULL,
	`fabricator_id` text NOT NULL,
	`dealer_id` text NOT NULL,
	`trade_account_id` text NOT NULL,
	`order_id` text NOT NULL,
	`dispatch_id` text NOT NULL,
	`issued_on` text NOT NULL,
	`issued_at` integer NOT NULL,
	`due_on` text NOT NULL,
	`discount_percent` text,
	`discount_until` text,
	`currency` text NOT NULL,
	`lines` text NOT NULL,
	`totals` text NOT NULL,
	`total_minor` integer NOT NULL,
	`open_minor` integer NOT NULL,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`dealer_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`dispatch_id`) REFERENCES `dispatches`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "invoices_currency" CHECK("invoices"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "invoices_issued" CHECK("invoices"."issued_on" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'),
	CONSTRAINT "invoices_due" CHECK("invoices"."due_on" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'),
	CONSTRAINT "invoices_open" CHECK("invoices"."open_minor" between 0 and "invoices"."total_minor")
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `invoices_by_sequence` ON `invoices` (`fabricator_id`,`sequence`);--> statement-breakpoint
CREATE UNIQUE INDEX `invoices_by_number` ON `invoices` (`fabricator_id`,`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `invoices_by_reference` ON `invoices` (`fabricator_id`,`reference`);--> statement-breakpoint
CREATE UNIQUE INDEX `invoices_by_dispatch` ON `invoices` (`dispatch_id`);--> statement-breakpoint
CREATE INDEX `invoices_of_fabricator` ON `invoices` (`fabricator_id`,`due_on`,`id`);--> statement-breakpoint
CREATE INDEX `invoices_of_dealer` ON `invoices` (`dealer_id`,`due_on`,`id`);--> statement-breakpoint
CREATE INDEX `invoices_open_of_fabricator` ON `invoices` (`fabricator_id`,`due_on`,`id`) WHERE open_minor > 0;--> statement-breakpoint
CREATE INDEX `invoices_open_of_dealer` ON `invoices` (`dealer_id`,`due_on`,`id`) WHERE open_minor > 0;--> statement-breakpoint
CREATE INDEX `invoices_open_of_account` ON `invoices` (`trade_account_id`,`due_on`) WHERE open_minor > 0;--> statement-breakpoint
CREATE INDEX `invoices_of_order` ON `invoices` (`order_id`);--> statement-breakpoint
CREATE TABLE `ledger_entries` (
	`id` text PRIMARY KEY NOT NULL,
	`fabricator_id` text NOT NULL,
	`on_day` text NOT NULL,
	`at` integer NOT NULL,
	`kind` text NOT NULL,
	`memo` text NOT NULL,
	`trade_account_id` text,
	`document_kind` text NOT NULL,
	`document_id` text NOT NULL,
	`reverses` text,
	`person_id` text,
	`closed` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`reverses`) REFERENCES `ledger_entries`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "ledger_entries_day" CHECK("ledger_entries"."on_day" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]')
) STRICT;
--> statement-breakpoint
CREATE INDEX `ledger_entries_by_document` ON `ledger_entries` (`document_kind`,`document_id`);--> statement-breakpoint
CREATE INDEX `ledger_entries_by_account` ON `ledger_entries` (`trade_account_id`,`at`,`id`);--> statement-breakpoint
CREATE INDEX `ledger_entries_by_day` ON `ledger_entries` (`fabricator_id`,`on_day`);--> statement-breakpoint
CREATE UNIQUE INDEX `ledger_entries_reversed_once` ON `ledger_entries` (`reverses`);--> statement-breakpoint
CREATE TABLE `number_series` (
	`company_id` text NOT NULL,
	`kind` text NOT NULL,
	`next` integer NOT NULL,
	PRIMARY KEY(`company_id`, `kind`),
	FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE TABLE `postings` (
	`entry_id` text NOT NULL,
	`position` integer NOT NULL,
	`account` text NOT NULL,
	`currency` text NOT NULL,
	`debit_minor` integer NOT NULL,
	`credit_minor` integer NOT NULL,
	PRIMARY KEY(`entry_id`, `position`),
	FOREIGN KEY (`entry_id`) REFERENCES `ledger_entries`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "postings_account" CHECK("postings"."account" in ('receivable', 'sales', 'delivery and surcharges', 'sales tax', 'bank', 'unapplied cash', 'discounts allowed', 'card clearing', 'card fees', 'customer deposits', 'sales returns', 'write-offs')),
	CONSTRAINT "postings_currency" CHECK("postings"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "postings_one_side" CHECK("postings"."debit_minor" >= 0 and "postings"."credit_minor" >= 0 and ("postings"."debit_minor" = 0) <> ("postings"."credit_minor" = 0))
) STRICT;
--> statement-breakpoint
CREATE TABLE `receipts` (
	`id` text PRIMARY KEY NOT NULL,
	`number` text NOT NULL,
	`fabricator_id` text NOT NULL,
	`trade_account_id` text NOT NULL,
	`currency` text NOT NULL,
	`received_on` text NOT NULL,
	`amount_minor` integer NOT NULL,
	`unapplied_minor` integer NOT NULL,
	`payer_reference` text NOT NULL,
	`recorded_at` integer NOT NULL,
	`recorded_by` text NOT NULL,
	`reversed_at` integer,
	`reversed_reason` text,
	FOREIGN KEY (`fabricator_id`) REFERENCES `companies`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`trade_account_id`) REFERENCES `trade_accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`recorded_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "receipts_currency" CHECK("receipts"."currency" in ('USD', 'CAD', 'EUR', 'GBP', 'CHF', 'NOK', 'SEK', 'DKK', 'AUD', 'NZD', 'JPY', 'KWD')),
	CONSTRAINT "receipts_received" CHECK("receipts"."received_on" glob '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'),
	CONSTRAINT "receipts_unapplied" CHECK("receipts"."unapplied_minor" between 0 and "receipts"."amount_minor")
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `receipts_by_number` ON `receipts` (`fabricator_id`,`number`);--> statement-breakpoint
CREATE INDEX `receipts_newest` ON `receipts` (`fabricator_id`,`recorded_at`,`id`);--> statement-breakpoint
CREATE INDEX `receipts_of_account` ON `receipts` (`trade_account_id`,`recorded_at`,`id`);