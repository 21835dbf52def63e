DROP INDEX `k_version_review` ON `listing_version`;--> statement-breakpoint
ALTER TABLE `listing_version` ADD `risk` smallint unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `stock_movement` ADD `note` varchar(200);--> statement-breakpoint
ALTER TABLE `stock_movement` ADD `command_id` varchar(80);--> statement-breakpoint
ALTER TABLE `stock_movement` ADD CONSTRAINT `u_stock_command` UNIQUE(`listing_id`,`command_id`);--> statement-breakpoint
CREATE INDEX `k_zip_point` ON `zip_place` (`lat`,`lng`);--> statement-breakpoint
CREATE INDEX `k_version_review` ON `listing_version` (`review`,`risk`,`submitted_at`);