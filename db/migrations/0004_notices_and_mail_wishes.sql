CREATE TABLE `notice` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`member_id` varchar(36) NOT NULL,
	`kind` varchar(24) NOT NULL,
	`cause` varchar(80) NOT NULL,
	`order_id` int unsigned,
	`listing_id` int unsigned,
	`facts` json NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`read_at` datetime(3),
	CONSTRAINT `notice_id` PRIMARY KEY(`id`),
	CONSTRAINT `notice_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `u_notice_cause` UNIQUE(`cause`,`member_id`)
);
--> statement-breakpoint
ALTER TABLE `member_profile` ADD `reminder_mail` boolean DEFAULT true NOT NULL;--> statement-breakpoint
ALTER TABLE `member_profile` ADD `quiet_from` varchar(5);--> statement-breakpoint
ALTER TABLE `member_profile` ADD `quiet_until` varchar(5);--> statement-breakpoint
ALTER TABLE `member_profile` ADD `quiet_zone` varchar(40);--> statement-breakpoint
ALTER TABLE `notice` ADD CONSTRAINT `notice_member_id_user_id_fk` FOREIGN KEY (`member_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `notice` ADD CONSTRAINT `notice_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `notice` ADD CONSTRAINT `notice_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `k_notice_member` ON `notice` (`member_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_notice_unread` ON `notice` (`member_id`,`read_at`);--> statement-breakpoint
CREATE INDEX `k_order_slot` ON `orders` (`state`,`slot_starts_at`);