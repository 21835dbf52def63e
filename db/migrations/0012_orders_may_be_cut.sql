ALTER TABLE `orders` ADD `category` varchar(12) DEFAULT 'fish' NOT NULL;--> statement-breakpoint
ALTER TABLE `orders` ADD `quantity_cut` int unsigned DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `orders` ADD `quantity_cut_at` datetime(3);--> statement-breakpoint
ALTER TABLE `orders` ADD `cut_from_balance_cents` int unsigned DEFAULT 0 NOT NULL;