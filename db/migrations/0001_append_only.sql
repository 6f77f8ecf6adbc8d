-- What was written about money and arrivals stays written: corrections are new rows.
CREATE TRIGGER ledger_no_update BEFORE UPDATE ON ledger BEGIN SELECT RAISE(ABORT, 'the ledger is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER ledger_no_delete BEFORE DELETE ON ledger BEGIN SELECT RAISE(ABORT, 'the ledger is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER scan_no_update BEFORE UPDATE ON scan BEGIN SELECT RAISE(ABORT, 'scans are append-only'); END;
--> statement-breakpoint
CREATE TRIGGER scan_no_delete BEFORE DELETE ON scan BEGIN SELECT RAISE(ABORT, 'scans are append-only'); END;
--> statement-breakpoint
CREATE TRIGGER payment_event_no_delete BEFORE DELETE ON payment_event BEGIN SELECT RAISE(ABORT, 'provider events are kept'); END;
