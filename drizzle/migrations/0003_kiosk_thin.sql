ALTER TABLE `kiosk` DROP COLUMN `shown_edition`;--> statement-breakpoint
ALTER TABLE `kiosk` DROP COLUMN `shown_at`;