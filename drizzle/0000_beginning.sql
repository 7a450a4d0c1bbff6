CREATE TABLE `account` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`account_id` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`provider_id` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
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
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`key` varchar(512) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`count` int NOT NULL,
	`last_request` bigint NOT NULL,
	CONSTRAINT `rate_limit_id` PRIMARY KEY(`id`),
	CONSTRAINT `rate_limit_key_unique` UNIQUE(`key`)
);
--> statement-breakpoint
CREATE TABLE `session` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`token` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`ip_address` varchar(64),
	`user_agent` text,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	CONSTRAINT `session_id` PRIMARY KEY(`id`),
	CONSTRAINT `session_token_unique` UNIQUE(`token`)
);
--> statement-breakpoint
CREATE TABLE `user` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(255) NOT NULL,
	`email` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`email_verified` boolean NOT NULL DEFAULT false,
	`image` text,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	`role` enum('member','teacher','admin') NOT NULL DEFAULT 'member',
	CONSTRAINT `user_id` PRIMARY KEY(`id`),
	CONSTRAINT `user_email_unique` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `verification` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`identifier` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`value` text NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `verification_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `stored_file` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`owner_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(255) NOT NULL,
	`bytes` int NOT NULL,
	`sha256` char(64) NOT NULL,
	`media_type` varchar(120) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `stored_file_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `import_draft` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`owner_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`pattern_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`details` json NOT NULL,
	`chart_file_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`chart_corrections` json NOT NULL,
	`finished_file_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`finished_corrections` json NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `import_draft_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `pattern` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`owner_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`title` varchar(120) NOT NULL,
	`maker` varchar(120) NOT NULL,
	`number` varchar(40) NOT NULL,
	`kind` enum('shirt','knitTop','sweatshirt','dress','skirt','fullSkirt','trousers','shorts','leggings','waistcoat','cardigan','jacket','coat','cape','wrap','jumpsuit','dungarees','robe','nightwear','swimwear','bonedBodice') NOT NULL,
	`silhouette` enum('close','fitted','semiFitted','loose','veryLoose') NOT NULL,
	`structure` enum('woven','knit') NOT NULL,
	`cloth` varchar(200) NOT NULL,
	`worn` enum('closed','open') NOT NULL,
	`seam_edges` json NOT NULL,
	`compare_as` json NOT NULL,
	`notes` text NOT NULL,
	`latest_revision_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `pattern_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `pattern_revision` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`pattern_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`number` int NOT NULL,
	`table` json NOT NULL,
	`chart_file_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`finished_file_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `pattern_revision_id` PRIMARY KEY(`id`),
	CONSTRAINT `pattern_revision_number` UNIQUE(`pattern_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `measurement_set` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`person_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`taken_on` date NOT NULL,
	`taken_by` enum('self','another') NOT NULL,
	`unit` enum('cm','mm','in') NOT NULL,
	`notes` text NOT NULL,
	`started_from_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`values` json NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `measurement_set_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `person` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`owner_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(80) NOT NULL,
	`stage` enum('adult','child') NOT NULL,
	`chest_word` enum('bust','chest') NOT NULL,
	`unit` enum('cm','mm','in') NOT NULL,
	`notes` text NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `person_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `saved_plan` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`owner_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`measurement_set_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`revision_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`options` json NOT NULL,
	`engine` varchar(40) NOT NULL,
	`input` json NOT NULL,
	`result` json NOT NULL,
	`status` varchar(20) NOT NULL,
	`zones` json NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`updated_at` datetime(3) NOT NULL,
	CONSTRAINT `saved_plan_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `account` ADD CONSTRAINT `account_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `session` ADD CONSTRAINT `session_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stored_file` ADD CONSTRAINT `stored_file_owner_id_user_id_fk` FOREIGN KEY (`owner_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_draft` ADD CONSTRAINT `import_draft_owner_id_user_id_fk` FOREIGN KEY (`owner_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_draft` ADD CONSTRAINT `import_draft_pattern_id_pattern_id_fk` FOREIGN KEY (`pattern_id`) REFERENCES `pattern`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_draft` ADD CONSTRAINT `import_draft_chart_file_id_stored_file_id_fk` FOREIGN KEY (`chart_file_id`) REFERENCES `stored_file`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_draft` ADD CONSTRAINT `import_draft_finished_file_id_stored_file_id_fk` FOREIGN KEY (`finished_file_id`) REFERENCES `stored_file`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pattern` ADD CONSTRAINT `pattern_owner_id_user_id_fk` FOREIGN KEY (`owner_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pattern_revision` ADD CONSTRAINT `pattern_revision_pattern_id_pattern_id_fk` FOREIGN KEY (`pattern_id`) REFERENCES `pattern`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pattern_revision` ADD CONSTRAINT `pattern_revision_chart_file_id_stored_file_id_fk` FOREIGN KEY (`chart_file_id`) REFERENCES `stored_file`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pattern_revision` ADD CONSTRAINT `pattern_revision_finished_file_id_stored_file_id_fk` FOREIGN KEY (`finished_file_id`) REFERENCES `stored_file`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `measurement_set` ADD CONSTRAINT `measurement_set_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person` ADD CONSTRAINT `person_owner_id_user_id_fk` FOREIGN KEY (`owner_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `saved_plan` ADD CONSTRAINT `saved_plan_owner_id_user_id_fk` FOREIGN KEY (`owner_id`) REFERENCES `user`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `saved_plan` ADD CONSTRAINT `saved_plan_measurement_set_id_measurement_set_id_fk` FOREIGN KEY (`measurement_set_id`) REFERENCES `measurement_set`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `saved_plan` ADD CONSTRAINT `saved_plan_revision_id_pattern_revision_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `pattern_revision`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `account_user` ON `account` (`user_id`);--> statement-breakpoint
CREATE INDEX `session_user` ON `session` (`user_id`);--> statement-breakpoint
CREATE INDEX `verification_identifier` ON `verification` (`identifier`);--> statement-breakpoint
CREATE INDEX `stored_file_owner` ON `stored_file` (`owner_id`,`id`);--> statement-breakpoint
CREATE INDEX `import_draft_owner` ON `import_draft` (`owner_id`,`id`);--> statement-breakpoint
CREATE INDEX `pattern_owner` ON `pattern` (`owner_id`,`title`,`id`);--> statement-breakpoint
CREATE INDEX `measurement_set_person` ON `measurement_set` (`person_id`,`taken_on`,`id`);--> statement-breakpoint
CREATE INDEX `person_owner` ON `person` (`owner_id`,`name`,`id`);--> statement-breakpoint
CREATE INDEX `saved_plan_owner` ON `saved_plan` (`owner_id`,`created_at`,`id`);