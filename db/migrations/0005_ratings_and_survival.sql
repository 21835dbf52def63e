CREATE TABLE `rating` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`order_id` int unsigned NOT NULL,
	`seller_id` int unsigned NOT NULL,
	`buyer_id` varchar(36) NOT NULL,
	`fish_mark` tinyint unsigned NOT NULL,
	`count_mark` tinyint unsigned NOT NULL,
	`contact_mark` tinyint unsigned NOT NULL,
	`words` varchar(600) NOT NULL DEFAULT '',
	`words_hidden` varchar(24),
	`reply` varchar(600),
	`reply_hidden` varchar(24),
	`replied_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	`edited_at` datetime(3),
	CONSTRAINT `rating_id` PRIMARY KEY(`id`),
	CONSTRAINT `rating_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `rating_orderId_unique` UNIQUE(`order_id`),
	CONSTRAINT `marks_are_1_to_5` CHECK(`rating`.`fish_mark` between 1 and 5 and `rating`.`count_mark` between 1 and 5 and `rating`.`contact_mark` between 1 and 5)
);
--> statement-breakpoint
CREATE TABLE `survival` (
	`order_id` int unsigned NOT NULL,
	`seller_id` int unsigned NOT NULL,
	`handed_over` int unsigned NOT NULL,
	`due_at` datetime(3) NOT NULL,
	`asked_at` datetime(3),
	`alive` int unsigned,
	`answered_at` datetime(3),
	`corrected_at` datetime(3),
	CONSTRAINT `survival_order_id` PRIMARY KEY(`order_id`),
	CONSTRAINT `no_more_alive_than_handed_over` CHECK(`survival`.`alive` is null or `survival`.`alive` <= `survival`.`handed_over`)
);
--> statement-breakpoint
ALTER TABLE `seller` ADD `fish_mark_sum` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `count_mark_sum` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `contact_mark_sum` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `survival_asked` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `survival_answered` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `survival_handed_over` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `seller` ADD `survival_alive` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `rating` ADD CONSTRAINT `rating_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `rating` ADD CONSTRAINT `rating_seller_id_seller_id_fk` FOREIGN KEY (`seller_id`) REFERENCES `seller`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `survival` ADD CONSTRAINT `survival_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `survival` ADD CONSTRAINT `survival_seller_id_seller_id_fk` FOREIGN KEY (`seller_id`) REFERENCES `seller`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `k_rating_seller` ON `rating` (`seller_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_survival_due` ON `survival` (`asked_at`,`due_at`);--> statement-breakpoint
CREATE INDEX `k_survival_seller` ON `survival` (`seller_id`);