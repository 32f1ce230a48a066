CREATE TABLE `rate_limits` (
	`key` varchar(190) NOT NULL,
	`hits` int unsigned NOT NULL,
	`resets_at` timestamp(3) NOT NULL,
	CONSTRAINT `rate_limits_key` PRIMARY KEY(`key`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`sid` varchar(128) NOT NULL,
	`user_id` int unsigned,
	`data` text NOT NULL,
	`expires_at` timestamp(3) NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `sessions_sid` PRIMARY KEY(`sid`)
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`email` varchar(254) NOT NULL,
	`display_name` varchar(60) NOT NULL,
	`password_hash` varchar(255) NOT NULL,
	`role` enum('learner','instructor','admin') NOT NULL DEFAULT 'learner',
	`units` enum('metric','imperial') NOT NULL DEFAULT 'metric',
	`theme` enum('paper','sun') NOT NULL DEFAULT 'paper',
	`about` varchar(500) NOT NULL DEFAULT '',
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `users_id` PRIMARY KEY(`id`),
	CONSTRAINT `users_email_unique` UNIQUE(`email`),
	CONSTRAINT `users_email_has_at` CHECK(`users`.`email` like '%_@_%'),
	CONSTRAINT `users_display_name_not_blank` CHECK(char_length(trim(`users`.`display_name`)) > 0)
);
--> statement-breakpoint
CREATE TABLE `builds` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`enrolment_id` int unsigned NOT NULL,
	`name` varchar(90) NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `builds_id` PRIMARY KEY(`id`),
	CONSTRAINT `builds_enrolment_id_unique` UNIQUE(`enrolment_id`)
);
--> statement-breakpoint
CREATE TABLE `field_book_entries` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`build_id` int unsigned NOT NULL,
	`lesson_key` varchar(40),
	`stop_key` varchar(40),
	`at_ms` int unsigned,
	`calculator` varchar(40) NOT NULL,
	`calculator_version` int unsigned NOT NULL,
	`inputs` json NOT NULL,
	`outputs` json NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `field_book_entries_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `course_revisions` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`number` smallint unsigned NOT NULL,
	`title` varchar(90) NOT NULL,
	`outcome` varchar(600) NOT NULL DEFAULT '',
	`weekends` tinyint unsigned NOT NULL DEFAULT 1,
	`tools` json NOT NULL,
	`hazards` json NOT NULL,
	`cover_drawing` enum('log-store','deck','picket-fence') NOT NULL,
	`facts` json NOT NULL,
	`not_covered` varchar(1000) NOT NULL DEFAULT '',
	`change_note` varchar(300) NOT NULL DEFAULT '',
	`version` int unsigned NOT NULL DEFAULT 1,
	`saved_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	`issued_at` timestamp(3),
	`issued_by_id` int unsigned,
	`draft_of` int unsigned GENERATED ALWAYS AS ((if(`issued_at` is null, `course_id`, null))) STORED,
	CONSTRAINT `course_revisions_id` PRIMARY KEY(`id`),
	CONSTRAINT `course_revisions_number` UNIQUE(`course_id`,`number`),
	CONSTRAINT `course_revisions_one_draft` UNIQUE(`draft_of`),
	CONSTRAINT `course_revisions_title` CHECK(char_length(trim(`course_revisions`.`title`)) > 0),
	CONSTRAINT `course_revisions_weekends` CHECK(`course_revisions`.`weekends` between 1 and 52)
);
--> statement-breakpoint
CREATE TABLE `course_staff` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`user_id` int unsigned NOT NULL,
	`role` enum('owner','helper') NOT NULL,
	`owner_of` int unsigned GENERATED ALWAYS AS ((if(`role` = 'owner', `course_id`, null))) STORED,
	CONSTRAINT `course_staff_id` PRIMARY KEY(`id`),
	CONSTRAINT `course_staff_person_once` UNIQUE(`course_id`,`user_id`),
	CONSTRAINT `course_staff_one_owner` UNIQUE(`owner_of`)
);
--> statement-breakpoint
CREATE TABLE `courses` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`slug` varchar(80) NOT NULL,
	`sheet_number` smallint unsigned NOT NULL,
	`state` enum('draft','issued','closed') NOT NULL DEFAULT 'draft',
	`price_cents` int unsigned NOT NULL DEFAULT 0,
	`currency` varchar(3) NOT NULL DEFAULT 'EUR',
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `courses_id` PRIMARY KEY(`id`),
	CONSTRAINT `courses_slug_unique` UNIQUE(`slug`),
	CONSTRAINT `courses_sheet_number_unique` UNIQUE(`sheet_number`),
	CONSTRAINT `courses_currency_code` CHECK(`courses`.`currency` regexp '^[A-Z]{3}$')
);
--> statement-breakpoint
CREATE TABLE `hindsight_notes` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`lesson_key` varchar(40) NOT NULL,
	`at_ms` int unsigned NOT NULL,
	`text` text NOT NULL,
	`author_id` int unsigned,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `hindsight_notes_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `kit_items` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`lesson_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`kind` enum('on-you','to-hand','caution') NOT NULL,
	`icon` varchar(30) NOT NULL DEFAULT 'generic',
	`title` varchar(90) NOT NULL,
	`detail` varchar(300) NOT NULL DEFAULT '',
	`position` smallint unsigned NOT NULL,
	CONSTRAINT `kit_items_id` PRIMARY KEY(`id`),
	CONSTRAINT `kit_items_key` UNIQUE(`lesson_id`,`key`),
	CONSTRAINT `kit_items_position` UNIQUE(`lesson_id`,`position`),
	CONSTRAINT `kit_items_title` CHECK(char_length(trim(`kit_items`.`title`)) > 0)
);
--> statement-breakpoint
CREATE TABLE `lessons` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`revision_id` int unsigned NOT NULL,
	`stage_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`title` varchar(90) NOT NULL,
	`summary` varchar(600) NOT NULL DEFAULT '',
	`you_will_want` varchar(300) NOT NULL DEFAULT '',
	`hazards` json NOT NULL,
	`position` smallint unsigned NOT NULL,
	`is_sample` boolean NOT NULL DEFAULT false,
	`video_id` int unsigned,
	`version` int unsigned NOT NULL DEFAULT 1,
	CONSTRAINT `lessons_id` PRIMARY KEY(`id`),
	CONSTRAINT `lessons_key` UNIQUE(`revision_id`,`key`),
	CONSTRAINT `lessons_position` UNIQUE(`stage_id`,`position`),
	CONSTRAINT `lessons_title` CHECK(char_length(trim(`lessons`.`title`)) > 0)
);
--> statement-breakpoint
CREATE TABLE `stages` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`revision_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`kind` enum('ground','base','frame','cladding','roof','finish') NOT NULL,
	`title` varchar(60) NOT NULL,
	`position` smallint unsigned NOT NULL,
	CONSTRAINT `stages_id` PRIMARY KEY(`id`),
	CONSTRAINT `stages_key` UNIQUE(`revision_id`,`key`),
	CONSTRAINT `stages_position` UNIQUE(`revision_id`,`position`),
	CONSTRAINT `stages_in_revision` UNIQUE(`id`,`revision_id`),
	CONSTRAINT `stages_title` CHECK(char_length(trim(`stages`.`title`)) > 0)
);
--> statement-breakpoint
CREATE TABLE `attempts` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`exercise_id` int unsigned NOT NULL,
	`try_number` int unsigned NOT NULL,
	`answer` json NOT NULL,
	`verdict` json NOT NULL,
	`outcome` enum('right','slip','wrong','unread') NOT NULL,
	`slip_id` varchar(40),
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `attempts_id` PRIMARY KEY(`id`),
	CONSTRAINT `attempts_slip_is_named` CHECK(`attempts`.`outcome` <> 'slip' or `attempts`.`slip_id` is not null)
);
--> statement-breakpoint
CREATE TABLE `exercises` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`stop_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`kind` enum('calculator','quiz') NOT NULL,
	`prompt` varchar(600) NOT NULL DEFAULT '',
	`tries` tinyint unsigned,
	`definition` json,
	`pass_mark` tinyint unsigned,
	CONSTRAINT `exercises_id` PRIMARY KEY(`id`),
	CONSTRAINT `exercises_stop_id_unique` UNIQUE(`stop_id`),
	CONSTRAINT `exercises_tries` CHECK(`exercises`.`tries` is null or `exercises`.`tries` between 1 and 20),
	CONSTRAINT `exercises_kind` CHECK((`exercises`.`kind` = 'calculator' and `exercises`.`definition` is not null and `exercises`.`pass_mark` is null) or (`exercises`.`kind` = 'quiz' and `exercises`.`definition` is null and `exercises`.`pass_mark` between 1 and 100))
);
--> statement-breakpoint
CREATE TABLE `quiz_questions` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`exercise_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`kind` enum('single','several','number','order') NOT NULL,
	`prompt` varchar(500) NOT NULL DEFAULT '',
	`definition` json NOT NULL,
	`position` smallint unsigned NOT NULL,
	CONSTRAINT `quiz_questions_id` PRIMARY KEY(`id`),
	CONSTRAINT `quiz_questions_key` UNIQUE(`exercise_id`,`key`),
	CONSTRAINT `quiz_questions_position` UNIQUE(`exercise_id`,`position`)
);
--> statement-breakpoint
CREATE TABLE `stop_states` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`course_id` int unsigned NOT NULL,
	`lesson_key` varchar(40) NOT NULL,
	`stop_key` varchar(40) NOT NULL,
	`seed` int unsigned NOT NULL,
	`tries_used` int unsigned NOT NULL DEFAULT 0,
	`solved_at` timestamp(3),
	CONSTRAINT `stop_states_id` PRIMARY KEY(`id`),
	CONSTRAINT `stop_states_person_once` UNIQUE(`user_id`,`course_id`,`lesson_key`,`stop_key`)
);
--> statement-breakpoint
CREATE TABLE `stops` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`lesson_id` int unsigned NOT NULL,
	`key` varchar(40) NOT NULL,
	`name` varchar(40) NOT NULL,
	`at_ms` int unsigned NOT NULL,
	`is_required` boolean NOT NULL DEFAULT true,
	`version` int unsigned NOT NULL DEFAULT 1,
	CONSTRAINT `stops_id` PRIMARY KEY(`id`),
	CONSTRAINT `stops_key` UNIQUE(`lesson_id`,`key`),
	CONSTRAINT `stops_moment` UNIQUE(`lesson_id`,`at_ms`),
	CONSTRAINT `stops_name` CHECK(char_length(trim(`stops`.`name`)) > 0)
);
--> statement-breakpoint
CREATE TABLE `answers` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`question_id` int unsigned NOT NULL,
	`author_id` int unsigned,
	`markdown` text NOT NULL,
	`html` text NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	`edited_at` timestamp(3),
	`deleted_at` timestamp(3),
	`version` int unsigned NOT NULL DEFAULT 1,
	CONSTRAINT `answers_id` PRIMARY KEY(`id`),
	CONSTRAINT `answers_of_question` UNIQUE(`question_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `fence_events` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`room_id` int unsigned NOT NULL,
	`number` int unsigned NOT NULL,
	`question_id` int unsigned NOT NULL,
	`kind` enum('asked','answered','edited','deleted','settled','unsettled') NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `fence_events_id` PRIMARY KEY(`id`),
	CONSTRAINT `fence_events_number` UNIQUE(`room_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `fence_rooms` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`lesson_key` varchar(40) NOT NULL,
	`last_number` int unsigned NOT NULL DEFAULT 0,
	CONSTRAINT `fence_rooms_id` PRIMARY KEY(`id`),
	CONSTRAINT `fence_rooms_lesson` UNIQUE(`course_id`,`lesson_key`)
);
--> statement-breakpoint
CREATE TABLE `idempotency_keys` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`route` varchar(80) NOT NULL,
	`key` varchar(64) NOT NULL,
	`fingerprint` char(64) NOT NULL,
	`status` smallint unsigned,
	`response` json,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `idempotency_keys_id` PRIMARY KEY(`id`),
	CONSTRAINT `idempotency_keys_once` UNIQUE(`user_id`,`route`,`key`)
);
--> statement-breakpoint
CREATE TABLE `questions` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`room_id` int unsigned NOT NULL,
	`at_ms` int unsigned,
	`title` varchar(160) NOT NULL,
	`author_id` int unsigned,
	`markdown` text NOT NULL,
	`html` text NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	`edited_at` timestamp(3),
	`deleted_at` timestamp(3),
	`version` int unsigned NOT NULL DEFAULT 1,
	`state` enum('open','settled','hidden') NOT NULL DEFAULT 'open',
	`settled_answer_id` int unsigned,
	`settled_by_id` int unsigned,
	CONSTRAINT `questions_id` PRIMARY KEY(`id`),
	CONSTRAINT `questions_title` CHECK(char_length(trim(`questions`.`title`)) > 0),
	CONSTRAINT `questions_settled_by_an_answer` CHECK((`questions`.`state` = 'settled') = (`questions`.`settled_answer_id` is not null) or `questions`.`state` = 'hidden')
);
--> statement-breakpoint
CREATE TABLE `caption_cues` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`track_id` int unsigned NOT NULL,
	`position` int unsigned NOT NULL,
	`cue_id` varchar(190) NOT NULL DEFAULT '',
	`start_ms` int unsigned NOT NULL,
	`end_ms` int unsigned NOT NULL,
	`settings` varchar(255) NOT NULL DEFAULT '',
	`text` text NOT NULL,
	CONSTRAINT `caption_cues_id` PRIMARY KEY(`id`),
	CONSTRAINT `caption_cues_position` UNIQUE(`track_id`,`position`),
	CONSTRAINT `caption_cues_end_after_start` CHECK(`caption_cues`.`end_ms` > `caption_cues`.`start_ms`)
);
--> statement-breakpoint
CREATE TABLE `caption_tracks` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`video_id` int unsigned NOT NULL,
	`language` varchar(35) NOT NULL,
	`label` varchar(60) NOT NULL,
	`is_original` boolean NOT NULL DEFAULT false,
	`preamble` text NOT NULL,
	`version` int unsigned NOT NULL DEFAULT 1,
	`saved_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `caption_tracks_id` PRIMARY KEY(`id`),
	CONSTRAINT `caption_tracks_language` UNIQUE(`video_id`,`language`)
);
--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`kind` varchar(40) NOT NULL,
	`payload` json NOT NULL,
	`state` enum('waiting','running','done','failed') NOT NULL DEFAULT 'waiting',
	`attempts` int unsigned NOT NULL DEFAULT 0,
	`run_after` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	`beat_at` timestamp(3),
	`failure` varchar(500),
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `jobs_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `videos` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`course_id` int unsigned NOT NULL,
	`lesson_key` varchar(40) NOT NULL,
	`uploader_id` int unsigned,
	`upload_id` varchar(64),
	`storage_key` varchar(190) NOT NULL,
	`poster_key` varchar(190),
	`original_name` varchar(255) NOT NULL,
	`content_type` varchar(100) NOT NULL DEFAULT 'video/mp4',
	`bytes` bigint unsigned NOT NULL,
	`state` enum('checking','ready','refused') NOT NULL DEFAULT 'checking',
	`refusal` varchar(500),
	`duration_ms` int unsigned,
	`width` int unsigned,
	`height` int unsigned,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `videos_id` PRIMARY KEY(`id`),
	CONSTRAINT `videos_upload_id_unique` UNIQUE(`upload_id`),
	CONSTRAINT `videos_ready_is_measured` CHECK(`videos`.`state` <> 'ready' or `videos`.`duration_ms` > 0),
	CONSTRAINT `videos_refused_says_why` CHECK(`videos`.`state` <> 'refused' or `videos`.`refusal` is not null)
);
--> statement-breakpoint
CREATE TABLE `enrolments` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`course_id` int unsigned NOT NULL,
	`revision_id` int unsigned NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `enrolments_id` PRIMARY KEY(`id`),
	CONSTRAINT `enrolments_person_once` UNIQUE(`user_id`,`course_id`)
);
--> statement-breakpoint
CREATE TABLE `kit_ticks` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`kit_item_id` int unsigned NOT NULL,
	`created_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `kit_ticks_id` PRIMARY KEY(`id`),
	CONSTRAINT `kit_ticks_person_once` UNIQUE(`user_id`,`kit_item_id`)
);
--> statement-breakpoint
CREATE TABLE `lesson_progress` (
	`id` int unsigned AUTO_INCREMENT NOT NULL,
	`user_id` int unsigned NOT NULL,
	`course_id` int unsigned NOT NULL,
	`lesson_key` varchar(40) NOT NULL,
	`intervals` json NOT NULL,
	`watched_ms` int unsigned NOT NULL DEFAULT 0,
	`position_ms` int unsigned NOT NULL DEFAULT 0,
	`state` enum('not-started','under-way','done') NOT NULL DEFAULT 'not-started',
	`done_at` timestamp(3),
	`updated_at` timestamp(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
	CONSTRAINT `lesson_progress_id` PRIMARY KEY(`id`),
	CONSTRAINT `lesson_progress_person_once` UNIQUE(`user_id`,`course_id`,`lesson_key`),
	CONSTRAINT `lesson_progress_done_has_date` CHECK(`lesson_progress`.`state` <> 'done' or `lesson_progress`.`done_at` is not null)
);
--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `builds` ADD CONSTRAINT `builds_enrolment_id_enrolments_id_fk` FOREIGN KEY (`enrolment_id`) REFERENCES `enrolments`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `field_book_entries` ADD CONSTRAINT `field_book_entries_build_id_builds_id_fk` FOREIGN KEY (`build_id`) REFERENCES `builds`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `course_revisions` ADD CONSTRAINT `course_revisions_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `course_revisions` ADD CONSTRAINT `course_revisions_issued_by_id_users_id_fk` FOREIGN KEY (`issued_by_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `course_staff` ADD CONSTRAINT `course_staff_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `course_staff` ADD CONSTRAINT `course_staff_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `hindsight_notes` ADD CONSTRAINT `hindsight_notes_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `hindsight_notes` ADD CONSTRAINT `hindsight_notes_author_id_users_id_fk` FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `kit_items` ADD CONSTRAINT `kit_items_lesson_id_lessons_id_fk` FOREIGN KEY (`lesson_id`) REFERENCES `lessons`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `lessons` ADD CONSTRAINT `lessons_video_id_videos_id_fk` FOREIGN KEY (`video_id`) REFERENCES `videos`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `lessons` ADD CONSTRAINT `lessons_stage_in_revision` FOREIGN KEY (`stage_id`,`revision_id`) REFERENCES `stages`(`id`,`revision_id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stages` ADD CONSTRAINT `stages_revision_id_course_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `course_revisions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `attempts` ADD CONSTRAINT `attempts_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `attempts` ADD CONSTRAINT `attempts_exercise_id_exercises_id_fk` FOREIGN KEY (`exercise_id`) REFERENCES `exercises`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `exercises` ADD CONSTRAINT `exercises_stop_id_stops_id_fk` FOREIGN KEY (`stop_id`) REFERENCES `stops`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `quiz_questions` ADD CONSTRAINT `quiz_questions_exercise_id_exercises_id_fk` FOREIGN KEY (`exercise_id`) REFERENCES `exercises`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stop_states` ADD CONSTRAINT `stop_states_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stop_states` ADD CONSTRAINT `stop_states_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `stops` ADD CONSTRAINT `stops_lesson_id_lessons_id_fk` FOREIGN KEY (`lesson_id`) REFERENCES `lessons`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `answers` ADD CONSTRAINT `answers_question_id_questions_id_fk` FOREIGN KEY (`question_id`) REFERENCES `questions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `answers` ADD CONSTRAINT `answers_author_id_users_id_fk` FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `fence_events` ADD CONSTRAINT `fence_events_room_id_fence_rooms_id_fk` FOREIGN KEY (`room_id`) REFERENCES `fence_rooms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `fence_events` ADD CONSTRAINT `fence_events_question` FOREIGN KEY (`question_id`) REFERENCES `questions`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `fence_rooms` ADD CONSTRAINT `fence_rooms_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `idempotency_keys` ADD CONSTRAINT `idempotency_keys_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `questions` ADD CONSTRAINT `questions_room_id_fence_rooms_id_fk` FOREIGN KEY (`room_id`) REFERENCES `fence_rooms`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `questions` ADD CONSTRAINT `questions_author_id_users_id_fk` FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `questions` ADD CONSTRAINT `questions_settled_by_id_users_id_fk` FOREIGN KEY (`settled_by_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `caption_cues` ADD CONSTRAINT `caption_cues_track_id_caption_tracks_id_fk` FOREIGN KEY (`track_id`) REFERENCES `caption_tracks`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `caption_tracks` ADD CONSTRAINT `caption_tracks_video_id_videos_id_fk` FOREIGN KEY (`video_id`) REFERENCES `videos`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `videos` ADD CONSTRAINT `videos_uploader_id_users_id_fk` FOREIGN KEY (`uploader_id`) REFERENCES `users`(`id`) ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `enrolments` ADD CONSTRAINT `enrolments_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `enrolments` ADD CONSTRAINT `enrolments_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `enrolments` ADD CONSTRAINT `enrolments_revision_id_course_revisions_id_fk` FOREIGN KEY (`revision_id`) REFERENCES `course_revisions`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `kit_ticks` ADD CONSTRAINT `kit_ticks_user_id_users_id_fk` FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `kit_ticks` ADD CONSTRAINT `kit_ticks_kit_item_id_kit_items_id_fk` FOREIGN KEY (`kit_item_id`) REFERENCES `kit_items`(`id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `lesson_progress` ADD CONSTRAINT `lesson_progress_enrolled` FOREIGN KEY (`user_id`,`course_id`) REFERENCES `enrolments`(`user_id`,`course_id`) ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `rate_limits_resets_at` ON `rate_limits` (`resets_at`);--> statement-breakpoint
CREATE INDEX `sessions_user_id` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_expires_at` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE INDEX `field_book_entries_build` ON `field_book_entries` (`build_id`,`id`);--> statement-breakpoint
CREATE INDEX `course_staff_user_id` ON `course_staff` (`user_id`);--> statement-breakpoint
CREATE INDEX `hindsight_notes_lesson` ON `hindsight_notes` (`course_id`,`lesson_key`,`at_ms`);--> statement-breakpoint
CREATE INDEX `attempts_person` ON `attempts` (`user_id`,`exercise_id`,`id`);--> statement-breakpoint
CREATE INDEX `answers_question` ON `answers` (`question_id`,`id`);--> statement-breakpoint
CREATE INDEX `idempotency_keys_created_at` ON `idempotency_keys` (`created_at`);--> statement-breakpoint
CREATE INDEX `questions_room_moment` ON `questions` (`room_id`,`at_ms`,`id`);--> statement-breakpoint
CREATE INDEX `jobs_next` ON `jobs` (`state`,`run_after`);--> statement-breakpoint
CREATE INDEX `videos_lesson` ON `videos` (`course_id`,`lesson_key`);--> statement-breakpoint
CREATE INDEX `enrolments_course` ON `enrolments` (`course_id`);