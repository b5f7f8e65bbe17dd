CREATE TABLE `firms` (
	`id` char(36) NOT NULL,
	`name` varchar(120) NOT NULL,
	`created_at` timestamp(3) NOT NULL,
	CONSTRAINT `firms_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `diagrams` (
	`id` char(36) NOT NULL,
	`project_id` char(36) NOT NULL,
	`name` varchar(80) NOT NULL,
	`document` longtext NOT NULL,
	`revision` int NOT NULL DEFAULT 1,
	`saved_at` timestamp(3) NOT NULL,
	`saved_by` char(36),
	`deleted_at` timestamp(3),
	`created_at` timestamp(3) NOT NULL,
	CONSTRAINT `diagrams_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `project_members` (
	`project_id` char(36) NOT NULL,
	`user_id` char(36) NOT NULL,
	`role` enum('lead','author','checker','viewer') NOT NULL,
	CONSTRAINT `project_members_project_id_user_id_pk` PRIMARY KEY(`project_id`,`user_id`)
);
--> statement-breakpoint
CREATE TABLE `projects` (
	`id` char(36) NOT NULL,
	`firm_id` char(36) NOT NULL,
	`job_number` varchar(40) NOT NULL,
	`name` varchar(120) NOT NULL,
	`part` varchar(120) NOT NULL DEFAULT '',
	`client` varchar(120) NOT NULL DEFAULT '',
	`place` varchar(120) NOT NULL DEFAULT '',
	`phase` varchar(60) NOT NULL DEFAULT '',
	`elevation` double,
	`elevation_unit` enum('m','ft'),
	`measured_pressure` double,
	`measured_pressure_unit` enum('kPa','hPa','inHg'),
	`unit_system` enum('SI','IP') NOT NULL DEFAULT 'SI',
	`relations` enum('ideal','real') NOT NULL DEFAULT 'ideal',
	`created_at` timestamp(3) NOT NULL,
	`updated_at` timestamp(3) NOT NULL,
	CONSTRAINT `projects_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `memberships` (
	`user_id` char(36) NOT NULL,
	`firm_id` char(36) NOT NULL,
	`role` enum('principal','designer','trainee','guest') NOT NULL,
	CONSTRAINT `memberships_user_id_firm_id_pk` PRIMARY KEY(`user_id`,`firm_id`)
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` char(36) NOT NULL,
	`email` varchar(254) NOT NULL,
	`name` varchar(120) NOT NULL,
	`initials` varchar(6) NOT NULL,
	`password_hash` varchar(255),
	`session_version` int NOT NULL DEFAULT 1,
	`created_at` timestamp(3) NOT NULL,
	CONSTRAINT `users_id` PRIMARY KEY(`id`),
	CONSTRAINT `users_email_unique` UNIQUE(`email`)
);
--> statement-breakpoint
ALTER TABLE `diagrams` ADD CONSTRAINT `diagrams_project_id_projects_id_fk` FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `diagrams` ADD CONSTRAINT `diagrams_saved_by_users_id_fk` FOREIGN KEY (`saved_by`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `project_members` ADD CONSTRAINT `project_members_project_id_projects_id_fk` FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `project_members` ADD CONSTRAINT `project_members_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `projects` ADD CONSTRAINT `projects_firm_id_firms_id_fk` FOREIGN KEY (`firm_id`) REFERENCES `firms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `memberships` ADD CONSTRAINT `memberships_firm_id_firms_id_fk` FOREIGN KEY (`firm_id`) REFERENCES `firms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `diagrams_by_project` ON `diagrams` (`project_id`,`deleted_at`);--> statement-breakpoint
CREATE INDEX `projects_by_firm` ON `projects` (`firm_id`,`updated_at`);