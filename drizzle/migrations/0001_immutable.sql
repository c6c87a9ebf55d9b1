-- What was published or written down about who did what never changes: the database itself refuses.
CREATE TRIGGER `edition_no_update` BEFORE UPDATE ON `edition` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an edition never changes';
--> statement-breakpoint
CREATE TRIGGER `edition_no_delete` BEFORE DELETE ON `edition` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an edition is never deleted';
--> statement-breakpoint
CREATE TRIGGER `audit_no_update` BEFORE UPDATE ON `audit_entry` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'the audit log never changes';
--> statement-breakpoint
CREATE TRIGGER `audit_no_delete` BEFORE DELETE ON `audit_entry` FOR EACH ROW
  SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'the audit log is never deleted';
