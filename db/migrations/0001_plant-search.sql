-- Names of plants for searching by the beginnings of words; accents and case are no difference.
-- Kept in step by triggers. A later migration that rebuilds `plants` drops them with the old table and must make them again.
CREATE VIRTUAL TABLE `plants_fts` USING fts5(`plant_id` UNINDEXED, `botanical`, `common`, tokenize = 'unicode61 remove_diacritics 2', prefix = '2 3');
--> statement-breakpoint
INSERT INTO `plants_fts` (`plant_id`, `botanical`, `common`) SELECT `id`, `botanical`, `common` FROM `plants`;
--> statement-breakpoint
CREATE TRIGGER `plants_fts_insert` AFTER INSERT ON `plants` BEGIN
	INSERT INTO `plants_fts` (`plant_id`, `botanical`, `common`) VALUES (new.`id`, new.`botanical`, new.`common`);
END;
--> statement-breakpoint
CREATE TRIGGER `plants_fts_update` AFTER UPDATE OF `id`, `botanical`, `common` ON `plants`
WHEN old.`id` IS NOT new.`id` OR old.`botanical` IS NOT new.`botanical` OR old.`common` IS NOT new.`common` BEGIN
	DELETE FROM `plants_fts` WHERE `plant_id` = old.`id`;
	INSERT INTO `plants_fts` (`plant_id`, `botanical`, `common`) VALUES (new.`id`, new.`botanical`, new.`common`);
END;
--> statement-breakpoint
CREATE TRIGGER `plants_fts_delete` AFTER DELETE ON `plants` BEGIN
	DELETE FROM `plants_fts` WHERE `plant_id` = old.`id`;
END;
