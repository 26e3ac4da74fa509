CREATE TRIGGER `audit_log_keeps_what_it_says` BEFORE UPDATE ON `audit_log`
BEGIN
	SELECT RAISE(ABORT, 'the audit log can''t be changed');
END;
--> statement-breakpoint
CREATE TRIGGER `audit_log_keeps_all_it_has` BEFORE DELETE ON `audit_log`
BEGIN
	SELECT RAISE(ABORT, 'the audit log can''t be deleted');
END;
