CREATE TABLE `outbox` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`to` varchar(320) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`user_id` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`kind` varchar(40) NOT NULL,
	`payload` json,
	`state` enum('waiting','sending','sent','failed') NOT NULL,
	`attempts` int NOT NULL,
	`next_at` datetime(3) NOT NULL,
	`lease_until` datetime(3),
	`lease_token` char(36) CHARACTER SET ascii COLLATE ascii_bin,
	`useful_until` datetime(3),
	`message_id` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`sent_at` datetime(3),
	`last_error` varchar(200),
	CONSTRAINT `outbox_id` PRIMARY KEY(`id`),
	CONSTRAINT `outbox_message_id_unique` UNIQUE(`message_id`)
);
--> statement-breakpoint
CREATE TABLE `mailbox_message` (
	`id` char(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
	`from` varchar(320) NOT NULL,
	`to` varchar(320) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`subject` text NOT NULL,
	`message_id` varchar(255) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
	`text` mediumtext NOT NULL,
	`html` mediumtext NOT NULL,
	`received_at` datetime(3) NOT NULL,
	CONSTRAINT `mailbox_message_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `outbox` ADD CONSTRAINT `outbox_user_id_user_id_fk` FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `outbox_next` ON `outbox` (`state`,`next_at`);--> statement-breakpoint
CREATE INDEX `outbox_user` ON `outbox` (`user_id`);--> statement-breakpoint
CREATE INDEX `outbox_to` ON `outbox` (`to`);--> statement-breakpoint
CREATE INDEX `mailbox_message_received` ON `mailbox_message` (`received_at`,`id`);--> statement-breakpoint
CREATE INDEX `mailbox_message_to` ON `mailbox_message` (`to`);