ALTER TABLE `shipment` MODIFY COLUMN `movement` json;--> statement-breakpoint
ALTER TABLE `shipment` ADD `alive_count` int unsigned;