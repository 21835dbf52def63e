CREATE TABLE `no_ship_day` (
	`day` date NOT NULL,
	`why` varchar(80) NOT NULL,
	`source` varchar(8) NOT NULL,
	`is_off` boolean NOT NULL DEFAULT false,
	`changed_by` varchar(36),
	`changed_at` datetime(3) NOT NULL,
	CONSTRAINT `no_ship_day_day` PRIMARY KEY(`day`)
);
--> statement-breakpoint
CREATE TABLE `route_check` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`kind` varchar(12) NOT NULL,
	`ship_day` date NOT NULL,
	`at` datetime(3) NOT NULL,
	`verdict` varchar(8) NOT NULL,
	`facts` json NOT NULL,
	CONSTRAINT `route_check_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `shipment` (
	`order_id` int unsigned NOT NULL,
	`ship_day` date NOT NULL,
	`arrive_day` date NOT NULL,
	`promised_at` datetime(3) NOT NULL,
	`packing` varchar(24) NOT NULL,
	`boxes` smallint unsigned NOT NULL,
	`deliver_to` varchar(8) NOT NULL,
	`carrier` varchar(60) NOT NULL,
	`address` json NOT NULL,
	`to_lat` double NOT NULL,
	`to_lng` double NOT NULL,
	`to_zone` varchar(40) NOT NULL,
	`papers` json NOT NULL,
	`tracking` varchar(60),
	`dispatched_at` datetime(3),
	`arrived_at` datetime(3),
	`movement` json NOT NULL,
	CONSTRAINT `shipment_order_id` PRIMARY KEY(`order_id`)
);
--> statement-breakpoint
CREATE TABLE `weather_hold` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`order_id` int unsigned NOT NULL,
	`number` smallint unsigned NOT NULL,
	`started_by` varchar(8) NOT NULL,
	`started_at` datetime(3) NOT NULL,
	`why` varchar(300) NOT NULL,
	`from_starts_at` datetime(3) NOT NULL,
	`proposed_starts_at` datetime(3),
	`proposed_ends_at` datetime(3),
	`proposed_ship_day` date,
	`proposed_window_id` int unsigned,
	`silence_moves` boolean NOT NULL,
	`answer` varchar(12),
	`answered_at` datetime(3),
	CONSTRAINT `weather_hold_id` PRIMARY KEY(`id`),
	CONSTRAINT `u_hold_number` UNIQUE(`order_id`,`number`)
);
--> statement-breakpoint
ALTER TABLE `orders` ADD `is_day_by_silence` boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE `route_check` ADD CONSTRAINT `route_check_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipment` ADD CONSTRAINT `shipment_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `weather_hold` ADD CONSTRAINT `weather_hold_order_id_orders_id_fk` FOREIGN KEY (`order_id`) REFERENCES `orders`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `weather_hold` ADD CONSTRAINT `weather_hold_proposed_window_id_pickup_window_id_fk` FOREIGN KEY (`proposed_window_id`) REFERENCES `pickup_window`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `k_route_check_order` ON `route_check` (`order_id`,`id`);