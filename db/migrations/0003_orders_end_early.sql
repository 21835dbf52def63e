ALTER TABLE `member_profile` ADD `no_shows` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `orders` ADD `no_show_by` varchar(6);--> statement-breakpoint
ALTER TABLE `orders` ADD `no_show_at` datetime(3);--> statement-breakpoint
ALTER TABLE `orders` ADD `buyer_moves` smallint unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `orders` ADD `seller_moves` smallint unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `orders` ADD `claim_type` varchar(20);--> statement-breakpoint
ALTER TABLE `seller` ADD `days_missed` int unsigned DEFAULT 0 NOT NULL;