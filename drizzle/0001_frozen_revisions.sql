-- References that would close a circle between schema files, and triggers that freeze an issued revision.
ALTER TABLE `videos` ADD CONSTRAINT `videos_course_id_courses_id_fk` FOREIGN KEY (`course_id`) REFERENCES `courses` (`id`) ON DELETE CASCADE;
--> statement-breakpoint
ALTER TABLE `questions` ADD CONSTRAINT `questions_settled_answer` FOREIGN KEY (`id`, `settled_answer_id`) REFERENCES `answers` (`question_id`, `id`);
--> statement-breakpoint
CREATE TRIGGER `stages_frozen_insert` BEFORE INSERT ON `stages` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = NEW.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `stages_frozen_update` BEFORE UPDATE ON `stages` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = OLD.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `stages_frozen_delete` BEFORE DELETE ON `stages` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = OLD.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `lessons_frozen_insert` BEFORE INSERT ON `lessons` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = NEW.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `lessons_frozen_update` BEFORE UPDATE ON `lessons` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = OLD.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `lessons_frozen_delete` BEFORE DELETE ON `lessons` FOR EACH ROW
BEGIN
  IF (SELECT issued_at FROM course_revisions WHERE id = OLD.revision_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `kit_items_frozen_insert` BEFORE INSERT ON `kit_items` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = NEW.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `kit_items_frozen_update` BEFORE UPDATE ON `kit_items` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = OLD.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `kit_items_frozen_delete` BEFORE DELETE ON `kit_items` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = OLD.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `stops_frozen_insert` BEFORE INSERT ON `stops` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = NEW.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `stops_frozen_update` BEFORE UPDATE ON `stops` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = OLD.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `stops_frozen_delete` BEFORE DELETE ON `stops` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM lessons l JOIN course_revisions r ON r.id = l.revision_id WHERE l.id = OLD.lesson_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `exercises_frozen_insert` BEFORE INSERT ON `exercises` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM stops s JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE s.id = NEW.stop_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `exercises_frozen_update` BEFORE UPDATE ON `exercises` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM stops s JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE s.id = OLD.stop_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `exercises_frozen_delete` BEFORE DELETE ON `exercises` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM stops s JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE s.id = OLD.stop_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `quiz_questions_frozen_insert` BEFORE INSERT ON `quiz_questions` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM exercises e JOIN stops s ON s.id = e.stop_id JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE e.id = NEW.exercise_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `quiz_questions_frozen_update` BEFORE UPDATE ON `quiz_questions` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM exercises e JOIN stops s ON s.id = e.stop_id JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE e.id = OLD.exercise_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `quiz_questions_frozen_delete` BEFORE DELETE ON `quiz_questions` FOR EACH ROW
BEGIN
  IF (SELECT r.issued_at FROM exercises e JOIN stops s ON s.id = e.stop_id JOIN lessons l ON l.id = s.lesson_id JOIN course_revisions r ON r.id = l.revision_id WHERE e.id = OLD.exercise_id) IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `course_revisions_frozen_update` BEFORE UPDATE ON `course_revisions` FOR EACH ROW
BEGIN
  IF OLD.issued_at IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
--> statement-breakpoint
CREATE TRIGGER `course_revisions_frozen_delete` BEFORE DELETE ON `course_revisions` FOR EACH ROW
BEGIN
  IF OLD.issued_at IS NOT NULL THEN
    SIGNAL SQLSTATE '45000' SET MYSQL_ERRNO = 1644, MESSAGE_TEXT = 'an issued revision is frozen';
  END IF;
END;
