CREATE TABLE `accounts` (
	`user_id` varchar(36) NOT NULL,
	`type` varchar(32) NOT NULL,
	`provider` varchar(64) NOT NULL,
	`provider_account_id` varchar(255) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`refresh_token` text,
	`access_token` text,
	`expires_at` int,
	`token_type` varchar(64),
	`scope` varchar(500),
	`id_token` text,
	`session_state` varchar(255),
	CONSTRAINT `accounts_provider_provider_account_id_pk` PRIMARY KEY(`provider`,`provider_account_id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `attempts` (
	`attempt_key` varchar(64) NOT NULL,
	`tries` int NOT NULL,
	`started_at` datetime(3) NOT NULL,
	CONSTRAINT `attempts_attempt_key` PRIMARY KEY(`attempt_key`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `audit_log` (
	`id` varchar(36) NOT NULL,
	`firm_id` varchar(36),
	`user_id` varchar(36),
	`action` varchar(64) NOT NULL,
	`subject_kind` varchar(32) NOT NULL,
	`subject_id` varchar(120) NOT NULL,
	`detail` json NOT NULL,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `audit_log_id` PRIMARY KEY(`id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `catalogues` (
	`id` varchar(36) NOT NULL,
	`slug` varchar(64) NOT NULL,
	`standard` varchar(120) NOT NULL,
	`title` varchar(200) NOT NULL,
	`source` varchar(500) NOT NULL DEFAULT '',
	`shape_count` int NOT NULL,
	`content_hash` varchar(64) NOT NULL,
	`seeded_at` datetime(3) NOT NULL,
	CONSTRAINT `catalogues_id` PRIMARY KEY(`id`),
	CONSTRAINT `catalogues_slug` UNIQUE(`slug`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `firms` (
	`id` varchar(36) NOT NULL,
	`name` varchar(120) NOT NULL,
	`demo` boolean NOT NULL DEFAULT false,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `firms_id` PRIMARY KEY(`id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `local_mail` (
	`id` varchar(36) NOT NULL,
	`recipient` varchar(254) NOT NULL,
	`subject` varchar(250) NOT NULL,
	`body` text NOT NULL,
	`sent_at` datetime(3) NOT NULL,
	CONSTRAINT `local_mail_id` PRIMARY KEY(`id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `memberships` (
	`id` varchar(36) NOT NULL,
	`firm_id` varchar(36) NOT NULL,
	`user_id` varchar(36) NOT NULL,
	`role` enum('owner','librarian','designer','checker','reader') NOT NULL,
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `memberships_id` PRIMARY KEY(`id`),
	CONSTRAINT `memberships_firm_user` UNIQUE(`firm_id`,`user_id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `password_resets` (
	`id` varchar(36) NOT NULL,
	`user_id` varchar(36) NOT NULL,
	`token_hash` varchar(64) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`used_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `password_resets_id` PRIMARY KEY(`id`),
	CONSTRAINT `password_resets_token` UNIQUE(`token_hash`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `section_versions` (
	`id` varchar(36) NOT NULL,
	`section_id` varchar(36) NOT NULL,
	`version` int NOT NULL,
	`name` varchar(120) NOT NULL,
	`standard` varchar(120) NOT NULL DEFAULT '',
	`project` varchar(160) NOT NULL DEFAULT '',
	`remark` varchar(500) NOT NULL DEFAULT '',
	`definition` json NOT NULL,
	`schema_version` int NOT NULL,
	`settings` json NOT NULL,
	`input_hash` varchar(64) NOT NULL,
	`status` enum('draft','approved','withdrawn') NOT NULL,
	`saved_by` varchar(36) NOT NULL,
	`saved_at` datetime(3) NOT NULL,
	CONSTRAINT `section_versions_id` PRIMARY KEY(`id`),
	CONSTRAINT `section_versions_version` UNIQUE(`section_id`,`version`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `sections` (
	`id` varchar(36) NOT NULL,
	`firm_id` varchar(36) NOT NULL,
	`name` varchar(120) NOT NULL,
	`standard` varchar(120) NOT NULL DEFAULT '',
	`project` varchar(160) NOT NULL DEFAULT '',
	`remark` varchar(500) NOT NULL DEFAULT '',
	`identity` varchar(250) character set utf8mb4 collate utf8mb4_bin,
	`kind` varchar(32) NOT NULL,
	`definition` json NOT NULL,
	`schema_version` int NOT NULL,
	`settings` json NOT NULL,
	`input_hash` varchar(64) NOT NULL,
	`area` double NOT NULL,
	`mass` double NOT NULL,
	`h` double NOT NULL,
	`b` double NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	`status` enum('draft','approved','withdrawn') NOT NULL DEFAULT 'draft',
	`created_by` varchar(36) NOT NULL,
	`updated_by` varchar(36) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`deleted_at` datetime(3),
	CONSTRAINT `sections_id` PRIMARY KEY(`id`),
	CONSTRAINT `sections_identity` UNIQUE(`firm_id`,`identity`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `shapes` (
	`id` varchar(120) NOT NULL,
	`catalogue_id` varchar(36) NOT NULL,
	`position` int NOT NULL,
	`designation` varchar(80) NOT NULL,
	`standard` varchar(120) NOT NULL,
	`family` varchar(60) NOT NULL,
	`kind` varchar(32) NOT NULL,
	`aliases` text NOT NULL,
	`search_text` varchar(500) NOT NULL,
	`definition` json NOT NULL,
	`schema_version` int NOT NULL,
	`properties` json NOT NULL,
	`area` double NOT NULL,
	`mass` double NOT NULL,
	`h` double NOT NULL,
	`b` double NOT NULL,
	`second_moment_y` double NOT NULL,
	`elastic_modulus_y` double NOT NULL,
	`plastic_modulus_y` double NOT NULL,
	`content_hash` varchar(64) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `shapes_id` PRIMARY KEY(`id`),
	CONSTRAINT `shapes_identity` UNIQUE(`standard`,`designation`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `users` (
	`id` varchar(36) NOT NULL,
	`name` varchar(120),
	`email` varchar(254) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`email_verified` datetime(3),
	`image` varchar(500),
	`password_hash` varchar(255),
	`session_epoch` int NOT NULL DEFAULT 0,
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `users_id` PRIMARY KEY(`id`),
	CONSTRAINT `users_email` UNIQUE(`email`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `verification_tokens` (
	`identifier` varchar(254) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`token` varchar(255) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`expires` datetime(3) NOT NULL,
	CONSTRAINT `verification_tokens_identifier_token_pk` PRIMARY KEY(`identifier`,`token`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
CREATE TABLE `rate_windows` (
	`client_key` char(43) NOT NULL,
	`started_at` datetime(3) NOT NULL,
	`hits` int unsigned NOT NULL,
	CONSTRAINT `rate_windows_client_key` PRIMARY KEY(`client_key`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci;
--> statement-breakpoint
ALTER TABLE `accounts` ADD CONSTRAINT `accounts_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_firm_id_firms_id_fk` FOREIGN KEY (`firm_id`) REFERENCES `firms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `password_resets` ADD CONSTRAINT `password_resets_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `section_versions` ADD CONSTRAINT `section_versions_section_id_sections_id_fk` FOREIGN KEY (`section_id`) REFERENCES `sections`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `section_versions` ADD CONSTRAINT `section_versions_saved_by_users_id_fk` FOREIGN KEY (`saved_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sections` ADD CONSTRAINT `sections_firm_id_firms_id_fk` FOREIGN KEY (`firm_id`) REFERENCES `firms`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sections` ADD CONSTRAINT `sections_created_by_users_id_fk` FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sections` ADD CONSTRAINT `sections_updated_by_users_id_fk` FOREIGN KEY (`updated_by`) REFERENCES `users`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shapes` ADD CONSTRAINT `shapes_catalogue_id_catalogues_id_fk` FOREIGN KEY (`catalogue_id`) REFERENCES `catalogues`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `accounts_user` ON `accounts` (`user_id`);--> statement-breakpoint
CREATE INDEX `attempts_started` ON `attempts` (`started_at`);--> statement-breakpoint
CREATE INDEX `audit_log_firm` ON `audit_log` (`firm_id`,`id`);--> statement-breakpoint
CREATE INDEX `audit_log_subject` ON `audit_log` (`subject_kind`,`subject_id`);--> statement-breakpoint
CREATE INDEX `local_mail_recipient` ON `local_mail` (`recipient`);--> statement-breakpoint
CREATE INDEX `memberships_user` ON `memberships` (`user_id`);--> statement-breakpoint
CREATE INDEX `password_resets_user` ON `password_resets` (`user_id`);--> statement-breakpoint
CREATE INDEX `sections_firm_updated` ON `sections` (`firm_id`,`deleted_at`,`updated_at`);--> statement-breakpoint
CREATE INDEX `shapes_catalogue` ON `shapes` (`catalogue_id`,`position`);--> statement-breakpoint
CREATE INDEX `shapes_family` ON `shapes` (`family`,`mass`);--> statement-breakpoint
CREATE INDEX `shapes_mass` ON `shapes` (`mass`);--> statement-breakpoint
CREATE INDEX `rate_windows_started` ON `rate_windows` (`started_at`);