-- A session may switch off foreign keys or checks for itself, or set its own clock; these guards refuse what such a session writes.
--> statement-breakpoint
CREATE TRIGGER `ledger_entries_guard` BEFORE INSERT ON `ledger_entries` FOR EACH ROW
BEGIN
  IF @@session.foreign_key_checks = 0 OR @@session.check_constraint_checks = 0 THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The book is only written with its checks on';
  END IF;
  SET NEW.recorded_at = CONVERT_TZ(SYSDATE(3), @@session.time_zone, '+00:00');
END;
--> statement-breakpoint
CREATE TRIGGER `ledger_lines_guard` BEFORE INSERT ON `ledger_lines` FOR EACH ROW
BEGIN
  IF @@session.foreign_key_checks = 0 OR @@session.check_constraint_checks = 0 THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The book is only written with its checks on';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `partner_events_guard` BEFORE INSERT ON `partner_events` FOR EACH ROW
BEGIN
  IF @@session.foreign_key_checks = 0 OR @@session.check_constraint_checks = 0 THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The book is only written with its checks on';
  END IF;
  SET NEW.recorded_at = CONVERT_TZ(SYSDATE(3), @@session.time_zone, '+00:00');
END;
--> statement-breakpoint
CREATE TRIGGER `ledger_seals_guard` BEFORE INSERT ON `ledger_seals` FOR EACH ROW
BEGIN
  IF @@session.foreign_key_checks = 0 OR @@session.check_constraint_checks = 0 THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The book is only written with its checks on';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `settlements_guard` BEFORE INSERT ON `settlements` FOR EACH ROW
BEGIN
  IF @@session.foreign_key_checks = 0 OR @@session.check_constraint_checks = 0 THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'The book is only written with its checks on';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `statements_frozen` BEFORE UPDATE ON `statements` FOR EACH ROW
BEGIN
  IF OLD.state = 'issued' AND (NEW.state <> 'issued' OR NOT (NEW.content <=> OLD.content) OR NEW.sha256 <> OLD.sha256
    OR NEW.payable <> OLD.payable OR NEW.tax <> OLD.tax OR NEW.currency <> OLD.currency OR NEW.month <> OLD.month
    OR NEW.company_id <> OLD.company_id OR NOT (NEW.workbook_file_id <=> OLD.workbook_file_id)) THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'An issued statement does not change';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `statements_kept` BEFORE DELETE ON `statements` FOR EACH ROW
BEGIN
  IF OLD.state = 'issued' THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'An issued statement does not change';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `statement_lines_frozen_update` BEFORE UPDATE ON `statement_lines` FOR EACH ROW
BEGIN
  IF EXISTS (SELECT 1 FROM `statements` WHERE `id` = OLD.statement_id AND `state` = 'issued') THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'An issued statement does not change';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `statement_lines_frozen_delete` BEFORE DELETE ON `statement_lines` FOR EACH ROW
BEGIN
  IF EXISTS (SELECT 1 FROM `statements` WHERE `id` = OLD.statement_id AND `state` = 'issued') THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'An issued statement does not change';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `statement_lines_frozen_insert` BEFORE INSERT ON `statement_lines` FOR EACH ROW
BEGIN
  IF EXISTS (SELECT 1 FROM `statements` WHERE `id` = NEW.statement_id AND `state` = 'issued') THEN
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'An issued statement does not change';
  END IF;
END;
