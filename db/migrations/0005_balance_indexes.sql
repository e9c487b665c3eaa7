CREATE INDEX `ledger_entries_corrects` ON `ledger_entries` (`corrects_entry_id`);--> statement-breakpoint
CREATE INDEX `shipments_counted` ON `shipments` (`counted_on`,`left_on`);