-- Shipping was announced before it was sold: terms without freight cannot be bought from, so they are taken back.
UPDATE `listing_search` SET `lane` = 0, `ship_states` = 0 WHERE `listing_id` IN (SELECT `v`.`listing_id` FROM `listing_version` `v` WHERE JSON_EXISTS(`v`.`body`, '$.shipping') AND NOT JSON_EXISTS(`v`.`body`, '$.shipping.freightCents'));--> statement-breakpoint
UPDATE `listing_version` SET `body` = JSON_REMOVE(`body`, '$.shipping') WHERE JSON_EXISTS(`body`, '$.shipping') AND NOT JSON_EXISTS(`body`, '$.shipping.freightCents');--> statement-breakpoint
UPDATE `listing` SET `draft` = JSON_REMOVE(`draft`, '$.shipping') WHERE JSON_EXISTS(`draft`, '$.shipping') AND NOT JSON_EXISTS(`draft`, '$.shipping.freightCents');
