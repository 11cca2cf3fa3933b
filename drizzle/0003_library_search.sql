CREATE VIRTUAL TABLE `library_search` USING fts5(
	title, purpose, tags, author, family, notes, facets,
	content='library_entries', content_rowid='row',
	tokenize='porter unicode61 remove_diacritics 2', prefix='2 3 4'
);
--> statement-breakpoint
CREATE TRIGGER `library_entries_added` AFTER INSERT ON `library_entries` BEGIN
	INSERT INTO library_search (rowid, title, purpose, tags, author, family, notes, facets)
	VALUES (new.row, new.title, new.purpose, new.tags, new.author, new.family, new.notes, new.facets);
END;
--> statement-breakpoint
CREATE TRIGGER `library_entries_removed` AFTER DELETE ON `library_entries` BEGIN
	INSERT INTO library_search (library_search, rowid, title, purpose, tags, author, family, notes, facets)
	VALUES ('delete', old.row, old.title, old.purpose, old.tags, old.author, old.family, old.notes, old.facets);
END;
--> statement-breakpoint
CREATE TRIGGER `library_entries_kept` BEFORE UPDATE ON `library_entries`
WHEN old.row <> new.row OR old.title <> new.title OR old.purpose <> new.purpose OR old.tags <> new.tags
	OR old.author <> new.author OR old.family <> new.family OR old.notes <> new.notes OR old.facets <> new.facets
BEGIN
	SELECT raise(ABORT, 'what the library lists is written anew, not changed');
END;
--> statement-breakpoint
CREATE TRIGGER `presets_listed` AFTER UPDATE OF `published_version_id` ON `presets` BEGIN
	DELETE FROM library_entries WHERE preset_id = new.id;
	INSERT INTO library_entries (
		preset_id, version_id, slug, author, title, purpose, notes, tags, family, kind, material, verdict, strain_share,
		longest, enclosure, facets, worked, failed, favourites, published_at
	)
	SELECT
		new.id, v.id, new.slug, new.author_name, v.title, v.purpose, v.printing_notes,
		coalesce((SELECT group_concat(value, ' ') FROM json_each(v.tags)), ''),
		v.family, v.kind, v.material, v.verdict, v.strain_share, max(v.size_x, v.size_y, v.size_z), v.enclosure,
		'kind' || v.kind || ' material' || replace(v.material, '-', '') || ' verdict' || replace(v.verdict, '-', '')
			|| CASE WHEN v.enclosure IN ('not-needed', 'helpful') THEN ' enclosurefree' ELSE '' END
			|| CASE WHEN max(v.size_x, v.size_y, v.size_z) <= 50 THEN ' fits50' ELSE '' END
			|| CASE WHEN max(v.size_x, v.size_y, v.size_z) <= 100 THEN ' fits100' ELSE '' END
			|| CASE WHEN max(v.size_x, v.size_y, v.size_z) <= 180 THEN ' fits180' ELSE '' END
			|| CASE WHEN max(v.size_x, v.size_y, v.size_z) <= 250 THEN ' fits250' ELSE '' END,
		(SELECT count(*) FROM preset_reports r JOIN preset_versions o ON o.id = r.version_id WHERE o.preset_id = new.id AND r.worked),
		(SELECT count(*) FROM preset_reports r JOIN preset_versions o ON o.id = r.version_id WHERE o.preset_id = new.id AND NOT r.worked),
		(SELECT count(*) FROM favourites f WHERE f.preset_id = new.id),
		coalesce(v.decided_at, v.handed_in_at)
	FROM preset_versions v WHERE v.id = new.published_version_id;
END;
--> statement-breakpoint
CREATE TRIGGER `preset_reports_counted` AFTER INSERT ON `preset_reports` BEGIN
	UPDATE library_entries SET worked = worked + new.worked, failed = failed + 1 - new.worked
	WHERE preset_id = (SELECT preset_id FROM preset_versions WHERE id = new.version_id);
END;
--> statement-breakpoint
CREATE TRIGGER `preset_reports_changed` AFTER UPDATE OF `worked` ON `preset_reports` BEGIN
	UPDATE library_entries SET worked = worked + new.worked - old.worked, failed = failed + old.worked - new.worked
	WHERE preset_id = (SELECT preset_id FROM preset_versions WHERE id = new.version_id);
END;
--> statement-breakpoint
CREATE TRIGGER `preset_reports_uncounted` AFTER DELETE ON `preset_reports` BEGIN
	UPDATE library_entries SET worked = worked - old.worked, failed = failed - 1 + old.worked
	WHERE preset_id = (SELECT preset_id FROM preset_versions WHERE id = old.version_id);
END;
--> statement-breakpoint
CREATE TRIGGER `favourites_counted` AFTER INSERT ON `favourites` BEGIN
	UPDATE library_entries SET favourites = favourites + 1 WHERE preset_id = new.preset_id;
END;
--> statement-breakpoint
CREATE TRIGGER `favourites_uncounted` AFTER DELETE ON `favourites` BEGIN
	UPDATE library_entries SET favourites = favourites - 1 WHERE preset_id = old.preset_id;
END;
--> statement-breakpoint
CREATE TRIGGER `preset_versions_immutable` BEFORE UPDATE ON `preset_versions`
WHEN old.state IN ('published', 'retired') AND (
	old.preset_id <> new.preset_id OR old.number <> new.number OR old.title <> new.title OR old.purpose <> new.purpose
	OR old.printing_notes <> new.printing_notes OR old.tags <> new.tags OR old.licence <> new.licence
	OR old.family <> new.family OR old.material <> new.material OR old."use" <> new."use" OR old."values" <> new."values"
	OR old.verdict <> new.verdict OR old.kind <> new.kind OR old.strain_share IS NOT new.strain_share
	OR old.size_x <> new.size_x OR old.size_y <> new.size_y OR old.size_z <> new.size_z OR old.mass IS NOT new.mass
	OR old.enclosure IS NOT new.enclosure OR old.started_from IS NOT new.started_from
	OR old.handed_in_at <> new.handed_in_at OR new.state NOT IN ('published', 'retired')
)
BEGIN
	SELECT raise(ABORT, 'a published version is not changed');
END;
--> statement-breakpoint
CREATE TRIGGER `preset_versions_permanent` BEFORE DELETE ON `preset_versions`
WHEN old.state IN ('published', 'retired')
BEGIN
	SELECT raise(ABORT, 'a published version is not deleted');
END;
--> statement-breakpoint
CREATE TRIGGER `preset_photos_immutable` BEFORE UPDATE ON `preset_photos`
WHEN (SELECT state FROM preset_versions WHERE id = old.version_id) IN ('published', 'retired') AND (
	old.version_id IS NOT new.version_id OR old.file <> new.file OR old.alt <> new.alt OR old.position <> new.position
)
BEGIN
	SELECT raise(ABORT, 'photos of a published version are not changed');
END;
--> statement-breakpoint
CREATE TRIGGER `preset_photos_permanent` BEFORE DELETE ON `preset_photos`
WHEN (SELECT state FROM preset_versions WHERE id = old.version_id) IN ('published', 'retired')
BEGIN
	SELECT raise(ABORT, 'photos of a published version are not deleted');
END;
