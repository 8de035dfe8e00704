CREATE TABLE `firm_settings` (
	`firm_id` varchar(36) NOT NULL,
	`version` int NOT NULL,
	`code` json,
	`stock` json,
	`updated_by` varchar(36) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `firm_settings_firm_id` PRIMARY KEY(`firm_id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
ALTER TABLE `firm_settings` ADD CONSTRAINT `firm_settings_firm_id_firms_id_fk` FOREIGN KEY (`firm_id`) REFERENCES `firms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `firm_settings` ADD CONSTRAINT `firm_settings_updated_by_users_id_fk` FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;