CREATE TABLE `own_calculator_versions` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`calculator_id` int unsigned NOT NULL,
	`number` int unsigned NOT NULL,
	`definition` json NOT NULL,
	`created_by_id` int unsigned,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `own_calculator_versions_id` PRIMARY KEY(`id`),
	CONSTRAINT `own_calculator_versions_number` UNIQUE(`calculator_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `own_calculators` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`title` varchar(60) NOT NULL DEFAULT '',
	`definition` json NOT NULL,
	`attachable` int unsigned,
	`version` int unsigned NOT NULL DEFAULT 1,
	`saved_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `own_calculators_id` PRIMARY KEY(`id`),
	CONSTRAINT `own_calculators_key` UNIQUE(`course_id`,`key`)
);
--> statement-breakpoint
ALTER TABLE `own_calculator_versions` ADD CONSTRAINT `own_calculator_versions_calculator_id_own_calculators_id_fk` FOREIGN KEY (`calculator_id`) REFERENCES `own_calculators`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `own_calculator_versions` ADD CONSTRAINT `own_calculator_versions_created_by_id_users_id_fk` FOREIGN KEY (`created_by_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `own_calculators` ADD CONSTRAINT `own_calculators_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;