CREATE TABLE `listing_report` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`reporter_id` varchar(36) NOT NULL,
	`reason` varchar(24) NOT NULL,
	`words` text,
	`created_at` datetime(3) NOT NULL,
	`open` tinyint DEFAULT 1,
	`outcome` varchar(16),
	`closing_reason` varchar(32),
	`note` text,
	`closed_at` datetime(3),
	`closed_by` varchar(36),
	CONSTRAINT `listing_report_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_listing_report_open` UNIQUE(`listing_id`,`reporter_id`,`open`)
);
--> statement-breakpoint
ALTER TABLE `listing_report` ADD CONSTRAINT `listing_report_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `listing_report` ADD CONSTRAINT `listing_report_reporter_id_user_id_fk` FOREIGN KEY (`reporter_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `k_listing_report_open` ON `listing_report` (`open`,`listing_id`,`id`);