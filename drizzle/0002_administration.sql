CREATE TABLE `spent_token` (
	`hash` varchar(64) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	CONSTRAINT `spent_token_hash` PRIMARY KEY(`hash`)
);
--> statement-breakpoint
CREATE TABLE `two_factor` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`secret` varchar(512) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`backup_codes` varchar(4096) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`verified` boolean DEFAULT true,
	`failed_verification_count` int DEFAULT 0,
	`locked_until` datetime(3),
	CONSTRAINT `two_factor_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `admin_act` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`at` datetime(3) NOT NULL,
	`actor_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`through` enum('page','command') NOT NULL,
	`action` enum('administratorMade','roleChanged','teacherRequestAccepted','teacherRequestDeclined','mailRetried') NOT NULL,
	`subject_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`detail` json NOT NULL,
	CONSTRAINT `admin_act_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `teacher_request` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`sentence` varchar(500) NOT NULL,
	`state` enum('pending','accepted','declined') NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`answered_at` datetime(3),
	CONSTRAINT `teacher_request_id` PRIMARY KEY(`id`),
	CONSTRAINT `teacher_request_user_id_unique` UNIQUE(`user_id`)
);
--> statement-breakpoint
ALTER TABLE `user` ADD `two_factor_enabled` boolean DEFAULT false;--> statement-breakpoint
ALTER TABLE `spent_token` ADD CONSTRAINT `spent_token_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `two_factor` ADD CONSTRAINT `two_factor_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `admin_act` ADD CONSTRAINT `admin_act_actor_id_user_id_fk` FOREIGN KEY (`actor_id`) REFERENCES `user`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `admin_act` ADD CONSTRAINT `admin_act_subject_id_user_id_fk` FOREIGN KEY (`subject_id`) REFERENCES `user`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `teacher_request` ADD CONSTRAINT `teacher_request_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `spent_token_user` ON `spent_token` (`user_id`);--> statement-breakpoint
CREATE INDEX `spent_token_expires` ON `spent_token` (`expires_at`);--> statement-breakpoint
CREATE INDEX `two_factor_user` ON `two_factor` (`user_id`);--> statement-breakpoint
CREATE INDEX `teacher_request_state` ON `teacher_request` (`state`,`id`);--> statement-breakpoint
CREATE INDEX `rate_limit_last_request` ON `rate_limit` (`last_request`);