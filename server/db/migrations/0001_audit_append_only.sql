-- The audit is a record: rows are added, never changed or taken away. Triggers fall with their table, so a later
-- migration that rebuilds audit_records has to make them again.
CREATE TRIGGER `audit_records_no_update` BEFORE UPDATE ON `audit_records` BEGIN
	SELECT RAISE(ABORT, 'audit rows are never changed');
END;
--> statement-breakpoint
CREATE TRIGGER `audit_records_no_delete` BEFORE DELETE ON `audit_records` BEGIN
	SELECT RAISE(ABORT, 'audit rows are never deleted');
END;
