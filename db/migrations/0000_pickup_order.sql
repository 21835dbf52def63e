CREATE TABLE `account` (
	`id` varchar(36) NOT NULL,
	`account_id` varchar(255) NOT NULL,
	`provider_id` varchar(60) NOT NULL,
	`user_id` varchar(36) NOT NULL,
	`access_token` text,
	`refresh_token` text,
	`id_token` text,
	`access_token_expires_at` datetime(3),
	`refresh_token_expires_at` datetime(3),
	`scope` text,
	`password` text,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `account_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `rate_limit` (
	`id` varchar(36) NOT NULL,
	`key` varchar(255) NOT NULL,
	`count` int NOT NULL,
	`last_request` bigint NOT NULL,
	CONSTRAINT `rate_limit_id` PRIMARY KEY(`id`),
	CONSTRAINT `rate_limit_key_unique` UNIQUE(`key`)
);
--> statement-breakpoint
CREATE TABLE `session` (
	`id` varchar(36) NOT NULL,
	`token` varchar(255) NOT NULL,
	`user_id` varchar(36) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`ip_address` varchar(64),
	`user_agent` text,
	`impersonated_by` varchar(36),
	CONSTRAINT `session_id` PRIMARY KEY(`id`),
	CONSTRAINT `session_token_unique` UNIQUE(`token`)
);
--> statement-breakpoint
CREATE TABLE `two_factor` (
	`id` varchar(36) NOT NULL,
	`secret` text NOT NULL,
	`backup_codes` text NOT NULL,
	`user_id` varchar(36) NOT NULL,
	`verified` boolean NOT NULL DEFAULT true,
	`failed_verification_count` int NOT NULL DEFAULT 0,
	`locked_until` datetime(3),
	CONSTRAINT `two_factor_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `user` (
	`id` varchar(36) NOT NULL,
	`name` varchar(120) NOT NULL,
	`email` varchar(254) NOT NULL,
	`email_verified` boolean NOT NULL DEFAULT false,
	`image` text,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`role` varchar(60) NOT NULL DEFAULT 'member',
	`banned` boolean NOT NULL DEFAULT false,
	`ban_reason` text,
	`ban_expires` datetime(3),
	`two_factor_enabled` boolean NOT NULL DEFAULT false,
	CONSTRAINT `user_id` PRIMARY KEY(`id`),
	CONSTRAINT `user_email_unique` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `verification` (
	`id` varchar(36) NOT NULL,
	`identifier` varchar(255) NOT NULL,
	`value` text NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `verification_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `listing_search` (
	`category` tinyint unsigned NOT NULL,
	`hil` int unsigned NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`species` smallint unsigned NOT NULL,
	`x` int NOT NULL,
	`y` int NOT NULL,
	`z` int NOT NULL,
	`qty` mediumint unsigned NOT NULL,
	`min_qty` mediumint unsigned NOT NULL,
	`price1` mediumint unsigned NOT NULL,
	`from2` mediumint unsigned NOT NULL,
	`price2` mediumint unsigned NOT NULL,
	`from3` mediumint unsigned NOT NULL,
	`price3` mediumint unsigned NOT NULL,
	`from4` mediumint unsigned NOT NULL,
	`price4` mediumint unsigned NOT NULL,
	`more_tiers` varbinary(60) NOT NULL,
	`small_price` mediumint unsigned NOT NULL,
	`size_lo_mm` smallint unsigned NOT NULL,
	`size_hi_mm` smallint unsigned NOT NULL,
	`next_day` smallint unsigned NOT NULL,
	`last_day` smallint unsigned NOT NULL,
	`open_days` bigint unsigned NOT NULL,
	`pickup` tinyint unsigned NOT NULL,
	`lane` smallint unsigned NOT NULL,
	`hidden_states` bigint unsigned NOT NULL,
	`rating_rank` smallint unsigned NOT NULL,
	`lat_e_6` int NOT NULL,
	`lng_e_6` int NOT NULL,
	`seller_id` int unsigned NOT NULL,
	`rev` int unsigned NOT NULL,
	`counted_category` tinyint unsigned NOT NULL DEFAULT 0,
	`counted_hil` int unsigned NOT NULL DEFAULT 0,
	CONSTRAINT `listing_search_category_hil_listing_id_pk` PRIMARY KEY(`category`,`hil`,`listing_id`),
	CONSTRAINT `u_listing` UNIQUE(`listing_id`)
);
--> statement-breakpoint
CREATE TABLE `map_cell` (
	`lvl` tinyint unsigned NOT NULL,
	`category` tinyint unsigned NOT NULL,
	`cell` int unsigned NOT NULL,
	`n` int NOT NULL,
	`sum_lat_e_6` bigint NOT NULL,
	`sum_lng_e_6` bigint NOT NULL,
	CONSTRAINT `map_cell_lvl_category_cell_pk` PRIMARY KEY(`lvl`,`category`,`cell`)
);
--> statement-breakpoint
CREATE TABLE `listing` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`seller_id` int unsigned NOT NULL,
	`category` varchar(12) NOT NULL,
	`state` varchar(16) NOT NULL,
	`live_version` int unsigned,
	`draft` json NOT NULL,
	`draft_revision` int unsigned NOT NULL DEFAULT 0,
	`expires_on` date,
	`free` int NOT NULL DEFAULT 0,
	`held` int NOT NULL DEFAULT 0,
	`pledged` int NOT NULL DEFAULT 0,
	`sold` int NOT NULL DEFAULT 0,
	`shipped` int NOT NULL DEFAULT 0,
	`delivered` int NOT NULL DEFAULT 0,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `listing_id` PRIMARY KEY(`id`),
	CONSTRAINT `listing_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `stock_not_negative` CHECK(`listing`.`free` >= 0 and `listing`.`held` >= 0 and `listing`.`pledged` >= 0 and `listing`.`sold` >= 0 and `listing`.`shipped` >= 0 and `listing`.`delivered` >= 0)
);
--> statement-breakpoint
CREATE TABLE `listing_version` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`number` int unsigned NOT NULL,
	`body` json NOT NULL,
	`review` varchar(12) NOT NULL,
	`flags` json NOT NULL,
	`submitted_at` datetime(3) NOT NULL,
	`decided_at` datetime(3),
	`decided_by` varchar(36),
	`reason_code` varchar(32),
	`reason_text` text,
	CONSTRAINT `listing_version_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_listing_version` UNIQUE(`listing_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `pickup_window` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`starts_at` datetime(3) NOT NULL,
	`ends_at` datetime(3) NOT NULL,
	`zone` varchar(40) NOT NULL,
	`capacity` smallint unsigned NOT NULL,
	`taken` smallint unsigned NOT NULL DEFAULT 0,
	`place_kind` varchar(12) NOT NULL,
	`closed` tinyint NOT NULL DEFAULT 0,
	CONSTRAINT `pickup_window_id` PRIMARY KEY(`id`),
	CONSTRAINT `pickup_window_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `window_not_overbooked` CHECK(`pickup_window`.`taken` <= `pickup_window`.`capacity`),
	CONSTRAINT `window_forwards` CHECK(`pickup_window`.`ends_at` > `pickup_window`.`starts_at`)
);
--> statement-breakpoint
CREATE TABLE `stock_movement` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`order_id` int unsigned,
	`reason` varchar(40) NOT NULL,
	`free` int NOT NULL DEFAULT 0,
	`held` int NOT NULL DEFAULT 0,
	`pledged` int NOT NULL DEFAULT 0,
	`sold` int NOT NULL DEFAULT 0,
	`shipped` int NOT NULL DEFAULT 0,
	`delivered` int NOT NULL DEFAULT 0,
	`by` varchar(36),
	`at` datetime(3) NOT NULL,
	CONSTRAINT `stock_movement_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `member_profile` (
	`member_id` varchar(36) NOT NULL,
	`place_label` varchar(120),
	`place_cell` varchar(24),
	`place_state` varchar(2),
	`units` varchar(8) NOT NULL DEFAULT 'us',
	`theme` varchar(8) NOT NULL DEFAULT 'system',
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `member_profile_member_id` PRIMARY KEY(`member_id`)
);
--> statement-breakpoint
CREATE TABLE `audit_log` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`actor_id` varchar(36),
	`act` varchar(48) NOT NULL,
	`subject` varchar(80) NOT NULL,
	`facts` json NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `audit_log_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `orders` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`buyer_id` varchar(36) NOT NULL,
	`seller_id` int unsigned NOT NULL,
	`listing_id` int unsigned NOT NULL,
	`listing_version_id` int unsigned NOT NULL,
	`state` varchar(16) NOT NULL,
	`reason` varchar(32),
	`version` int unsigned NOT NULL DEFAULT 1,
	`quantity` int unsigned NOT NULL,
	`hand_over` varchar(8) NOT NULL,
	`pay_mode` varchar(8) NOT NULL,
	`balance_due` varchar(12) NOT NULL,
	`needs_acceptance` boolean NOT NULL,
	`goods_cents` int unsigned NOT NULL,
	`box_cents` int unsigned NOT NULL DEFAULT 0,
	`freight_cents` int unsigned NOT NULL DEFAULT 0,
	`tax_cents` int unsigned NOT NULL DEFAULT 0,
	`total_cents` int unsigned NOT NULL,
	`deposit_cents` int unsigned NOT NULL,
	`first_charge_cents` int unsigned NOT NULL,
	`balance_cents` int unsigned NOT NULL,
	`fee_bp` smallint unsigned NOT NULL,
	`fee_cents` int unsigned NOT NULL,
	`refunded_cents` int unsigned NOT NULL DEFAULT 0,
	`window_id` int unsigned,
	`slot_starts_at` datetime(3),
	`slot_ends_at` datetime(3),
	`zone` varchar(40) NOT NULL,
	`buyer_state` varchar(2) NOT NULL,
	`buyer_cell` varchar(24) NOT NULL,
	`hand_over_code` varchar(6) NOT NULL,
	`code_tries` smallint unsigned NOT NULL DEFAULT 0,
	`count_handed_over` int unsigned,
	`accepted_at` datetime(3),
	`balance_paid_at` datetime(3),
	`handed_over_at` datetime(3),
	`settled_at` datetime(3),
	`clock_at` datetime(3),
	`clock_edge` varchar(4),
	`freeze` varchar(8) NOT NULL DEFAULT 'none',
	`payment_dispute` varchar(6) NOT NULL DEFAULT 'none',
	`recall` varchar(8) NOT NULL DEFAULT 'none',
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `orders_id` PRIMARY KEY(`id`),
	CONSTRAINT `orders_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `order_adds_up` CHECK(`orders`.`total_cents` = `orders`.`goods_cents` + `orders`.`box_cents` + `orders`.`freight_cents` + `orders`.`tax_cents`),
	CONSTRAINT `charges_add_up` CHECK(`orders`.`total_cents` = `orders`.`first_charge_cents` + `orders`.`balance_cents`)
);
--> statement-breakpoint
CREATE TABLE `order_event` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`command_id` varchar(80) NOT NULL,
	`edge` varchar(4) NOT NULL,
	`from_state` varchar(16),
	`to_state` varchar(16) NOT NULL,
	`actor` varchar(10) NOT NULL,
	`actor_id` varchar(36),
	`note` text,
	`facts` json NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `order_event_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_order_command` UNIQUE(`order_id`,`command_id`)
);
--> statement-breakpoint
CREATE TABLE `outbox` (
	`seq` bigint unsigned AUTO_INCREMENT NOT NULL,
	`kind` varchar(32) NOT NULL,
	`ref` bigint unsigned NOT NULL,
	`body` json NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`run_after` datetime(3) NOT NULL,
	`attempts` smallint unsigned NOT NULL DEFAULT 0,
	`done_at` datetime(3),
	`dead_at` datetime(3),
	`last_error` text,
	CONSTRAINT `outbox_seq` PRIMARY KEY(`seq`)
);
--> statement-breakpoint
CREATE TABLE `ledger_entry` (
	`id` bigint unsigned AUTO_INCREMENT NOT NULL,
	`group_id` int unsigned NOT NULL,
	`account` varchar(20) NOT NULL,
	`amount_cents` int NOT NULL,
	`order_id` int unsigned NOT NULL,
	`seller_id` int unsigned,
	CONSTRAINT `ledger_entry_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `ledger_group` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`kind` varchar(24) NOT NULL,
	`cause` varchar(120) NOT NULL,
	`processor_id` varchar(96),
	`at` datetime(3) NOT NULL,
	CONSTRAINT `ledger_group_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_ledger_cause` UNIQUE(`cause`)
);
--> statement-breakpoint
CREATE TABLE `payment` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`purpose` varchar(8) NOT NULL,
	`amount_cents` int unsigned NOT NULL,
	`status` varchar(12) NOT NULL,
	`session_id` varchar(96),
	`pay_url` varchar(1000),
	`intent_id` varchar(96),
	`charge_id` varchar(96),
	`processor_cost_cents` int unsigned NOT NULL DEFAULT 0,
	`refunded_cents` int unsigned NOT NULL DEFAULT 0,
	`capture_before` datetime(3),
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `payment_id` PRIMARY KEY(`id`),
	CONSTRAINT `payment_sessionId_unique` UNIQUE(`session_id`)
);
--> statement-breakpoint
CREATE TABLE `processor_event` (
	`id` varchar(96) NOT NULL,
	`type` varchar(64) NOT NULL,
	`facts` json NOT NULL,
	`received_at` datetime(3) NOT NULL,
	`applied_at` datetime(3),
	CONSTRAINT `processor_event_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `refund` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`payment_id` int unsigned NOT NULL,
	`amount_cents` int unsigned NOT NULL,
	`status` varchar(8) NOT NULL,
	`processor_id` varchar(96),
	`why` varchar(40) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `refund_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `transfer` (
	`order_id` int unsigned NOT NULL,
	`amount_cents` int unsigned NOT NULL,
	`status` varchar(8) NOT NULL,
	`processor_id` varchar(96),
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `transfer_order_id` PRIMARY KEY(`order_id`)
);
--> statement-breakpoint
CREATE TABLE `photo` (
	`id` varchar(32) NOT NULL,
	`member_id` varchar(36) NOT NULL,
	`width_px` smallint unsigned NOT NULL,
	`height_px` smallint unsigned NOT NULL,
	`looks_like` varchar(16) NOT NULL,
	`ground` varchar(7) NOT NULL,
	`taken_on` date,
	`bytes` int unsigned NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `photo_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `cell_population` (
	`size_thousandths` smallint unsigned NOT NULL,
	`iy` smallint unsigned NOT NULL,
	`ix` smallint unsigned NOT NULL,
	`population` int unsigned NOT NULL,
	CONSTRAINT `cell_population_size_thousandths_iy_ix_pk` PRIMARY KEY(`size_thousandths`,`iy`,`ix`)
);
--> statement-breakpoint
CREATE TABLE `city_place` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`name` varchar(64) NOT NULL,
	`state` varchar(2) NOT NULL,
	`lat` double NOT NULL,
	`lng` double NOT NULL,
	`population` int unsigned NOT NULL,
	CONSTRAINT `city_place_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `zip_place` (
	`zip` varchar(5) NOT NULL,
	`city` varchar(64) NOT NULL,
	`state` varchar(2) NOT NULL,
	`lat` double NOT NULL,
	`lng` double NOT NULL,
	CONSTRAINT `zip_place_zip` PRIMARY KEY(`zip`)
);
--> statement-breakpoint
CREATE TABLE `call_count` (
	`bucket` varchar(120) NOT NULL,
	`window_start` bigint unsigned NOT NULL,
	`used` int unsigned NOT NULL,
	CONSTRAINT `call_count_bucket_window_start_pk` PRIMARY KEY(`bucket`,`window_start`)
);
--> statement-breakpoint
CREATE TABLE `idempotency_key` (
	`member_id` varchar(36) NOT NULL,
	`key` varchar(80) NOT NULL,
	`endpoint` varchar(120) NOT NULL,
	`fingerprint` varchar(64) NOT NULL,
	`status` smallint unsigned,
	`reply` mediumtext,
	`started_at` datetime(3) NOT NULL,
	CONSTRAINT `idempotency_key_member_id_key_pk` PRIMARY KEY(`member_id`,`key`)
);
--> statement-breakpoint
CREATE TABLE `rule_evidence` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`member_id` varchar(36) NOT NULL,
	`party` varchar(8) NOT NULL,
	`shown` json NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `rule_evidence_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `species_rule` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`rule_key` varchar(60) NOT NULL,
	`version` smallint unsigned NOT NULL DEFAULT 1,
	`taxon_id` varchar(60) NOT NULL,
	`jurisdiction` varchar(2) NOT NULL,
	`area_text` varchar(160),
	`activities` json NOT NULL,
	`status` varchar(24) NOT NULL,
	`conditions` json NOT NULL,
	`papers_needed` json NOT NULL,
	`source_title` varchar(200) NOT NULL,
	`source_url` varchar(300),
	`source_date` varchar(40) NOT NULL,
	`checked_on` date NOT NULL,
	`review_due` date NOT NULL,
	`confidence` varchar(1) NOT NULL,
	`active` boolean NOT NULL DEFAULT true,
	`created_by` varchar(36),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `species_rule_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_rule_version` UNIQUE(`rule_key`,`version`)
);
--> statement-breakpoint
CREATE TABLE `seller` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`public_id` varchar(22) NOT NULL,
	`member_id` varchar(36) NOT NULL,
	`farm_name` varchar(80) NOT NULL,
	`about` text NOT NULL,
	`kind` varchar(16) NOT NULL,
	`street` varchar(120) NOT NULL,
	`city` varchar(64) NOT NULL,
	`state` varchar(2) NOT NULL,
	`zip` varchar(5) NOT NULL,
	`phone` varchar(24) NOT NULL,
	`true_lat` double NOT NULL,
	`true_lng` double NOT NULL,
	`cell_id` varchar(24) NOT NULL,
	`cell_lat` double NOT NULL,
	`cell_lng` double NOT NULL,
	`zone` varchar(40) NOT NULL,
	`licences` json NOT NULL,
	`payout_account_id` varchar(64),
	`charges_enabled` boolean NOT NULL DEFAULT false,
	`payouts_enabled` boolean NOT NULL DEFAULT false,
	`rating_count` int unsigned NOT NULL DEFAULT 0,
	`rating_sum` int unsigned NOT NULL DEFAULT 0,
	`answered_in_time` int unsigned NOT NULL DEFAULT 0,
	`answers_missed` int unsigned NOT NULL DEFAULT 0,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `seller_id` PRIMARY KEY(`id`),
	CONSTRAINT `seller_publicId_unique` UNIQUE(`public_id`),
	CONSTRAINT `seller_memberId_unique` UNIQUE(`member_id`)
);
--> statement-breakpoint
ALTER TABLE `account` ADD CONSTRAINT `account_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `session` ADD CONSTRAINT `session_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `two_factor` ADD CONSTRAINT `two_factor_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `listing` ADD CONSTRAINT `listing_seller_id_seller_id_fk` FOREIGN KEY (`seller_id`) REFERENCES `seller`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `listing_version` ADD CONSTRAINT `listing_version_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pickup_window` ADD CONSTRAINT `pickup_window_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stock_movement` ADD CONSTRAINT `stock_movement_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `member_profile` ADD CONSTRAINT `member_profile_member_id_user_id_fk` FOREIGN KEY (`member_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `orders` ADD CONSTRAINT `orders_seller_id_seller_id_fk` FOREIGN KEY (`seller_id`) REFERENCES `seller`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `orders` ADD CONSTRAINT `orders_listing_id_listing_id_fk` FOREIGN KEY (`listing_id`) REFERENCES `listing`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `orders` ADD CONSTRAINT `orders_window_id_pickup_window_id_fk` FOREIGN KEY (`window_id`) REFERENCES `pickup_window`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `order_event` ADD CONSTRAINT `order_event_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_entry` ADD CONSTRAINT `ledger_entry_group_id_ledger_group_id_fk` FOREIGN KEY (`group_id`) REFERENCES `ledger_group`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `payment` ADD CONSTRAINT `payment_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `seller` ADD CONSTRAINT `seller_member_id_user_id_fk` FOREIGN KEY (`member_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `k_account_user` ON `account` (`user_id`);--> statement-breakpoint
CREATE INDEX `k_session_user` ON `session` (`user_id`);--> statement-breakpoint
CREATE INDEX `k_two_factor_user` ON `two_factor` (`user_id`);--> statement-breakpoint
CREATE INDEX `k_verification_identifier` ON `verification` (`identifier`);--> statement-breakpoint
CREATE INDEX `k_species` ON `listing_search` (`species`,`hil`,`x`,`y`,`z`,`qty`,`min_qty`,`price1`,`from2`,`price2`,`from3`,`price3`,`from4`,`price4`,`more_tiers`,`size_lo_mm`,`size_hi_mm`,`next_day`,`last_day`,`open_days`,`pickup`,`lane`,`hidden_states`,`rating_rank`);--> statement-breakpoint
CREATE INDEX `k_price` ON `listing_search` (`category`,`small_price`,`listing_id`,`x`,`y`,`z`,`species`,`qty`,`min_qty`,`price1`,`from2`,`price2`,`from3`,`price3`,`from4`,`price4`,`more_tiers`,`size_lo_mm`,`size_hi_mm`,`next_day`,`last_day`,`open_days`,`pickup`,`lane`,`hidden_states`);--> statement-breakpoint
CREATE INDEX `k_soonest` ON `listing_search` (`category`,`next_day`,`x`,`y`,`z`);--> statement-breakpoint
CREATE INDEX `k_rated` ON `listing_search` (`category`,`rating_rank`,`x`,`y`,`z`);--> statement-breakpoint
CREATE INDEX `k_listing_seller` ON `listing` (`seller_id`,`state`);--> statement-breakpoint
CREATE INDEX `k_listing_state` ON `listing` (`state`,`id`);--> statement-breakpoint
CREATE INDEX `k_version_review` ON `listing_version` (`review`,`submitted_at`);--> statement-breakpoint
CREATE INDEX `k_window_listing` ON `pickup_window` (`listing_id`,`starts_at`);--> statement-breakpoint
CREATE INDEX `k_stock_listing` ON `stock_movement` (`listing_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_stock_order` ON `stock_movement` (`order_id`);--> statement-breakpoint
CREATE INDEX `k_audit_subject` ON `audit_log` (`subject`,`id`);--> statement-breakpoint
CREATE INDEX `k_audit_actor` ON `audit_log` (`actor_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_order_buyer` ON `orders` (`buyer_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_order_seller` ON `orders` (`seller_id`,`state`,`slot_starts_at`);--> statement-breakpoint
CREATE INDEX `k_order_listing` ON `orders` (`listing_id`,`state`);--> statement-breakpoint
CREATE INDEX `k_order_clock` ON `orders` (`clock_at`);--> statement-breakpoint
CREATE INDEX `k_event_order` ON `order_event` (`order_id`,`id`);--> statement-breakpoint
CREATE INDEX `k_outbox_waiting` ON `outbox` (`done_at`,`dead_at`,`run_after`);--> statement-breakpoint
CREATE INDEX `k_outbox_ref` ON `outbox` (`kind`,`ref`);--> statement-breakpoint
CREATE INDEX `k_ledger_order` ON `ledger_entry` (`order_id`,`account`);--> statement-breakpoint
CREATE INDEX `k_ledger_group` ON `ledger_entry` (`group_id`);--> statement-breakpoint
CREATE INDEX `k_ledger_group_order` ON `ledger_group` (`order_id`);--> statement-breakpoint
CREATE INDEX `k_payment_order` ON `payment` (`order_id`);--> statement-breakpoint
CREATE INDEX `k_payment_intent` ON `payment` (`intent_id`);--> statement-breakpoint
CREATE INDEX `k_processor_event_waiting` ON `processor_event` (`applied_at`,`received_at`);--> statement-breakpoint
CREATE INDEX `k_refund_order` ON `refund` (`order_id`);--> statement-breakpoint
CREATE INDEX `k_photo_member` ON `photo` (`member_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `k_photo_looks` ON `photo` (`looks_like`);--> statement-breakpoint
CREATE INDEX `k_city_name` ON `city_place` (`name`,`population`);--> statement-breakpoint
CREATE INDEX `k_city_state` ON `city_place` (`state`,`name`);--> statement-breakpoint
CREATE INDEX `k_evidence_order` ON `rule_evidence` (`order_id`);--> statement-breakpoint
CREATE INDEX `k_rule_place` ON `species_rule` (`jurisdiction`,`taxon_id`);--> statement-breakpoint
CREATE INDEX `k_seller_payout` ON `seller` (`payout_account_id`);--> statement-breakpoint
CREATE INDEX `k_seller_cell` ON `seller` (`cell_id`);