-- Each revision with its last standing and its latest content.
CREATE VIEW revision_now AS
SELECT
  r.id AS id,
  CASE WHEN r.correlation_id IS NULL THEN 'property-equation' ELSE 'correlation' END AS kind,
  coalesce(k.slug, e.slug) AS slug,
  k.geometry AS geometry,
  r.number AS number,
  r.originator_id AS originator_id,
  r.created_at AS created_at,
  s.standing AS standing,
  s.at AS standing_at,
  s.note AS standing_note,
  c.id AS content_id,
  c.iteration AS iteration,
  c.hash AS hash,
  c.title AS title,
  c.phase AS phase
FROM revision r
LEFT JOIN correlation k ON k.id = r.correlation_id
LEFT JOIN property_equation e ON e.id = r.property_equation_id
JOIN standing_event s
  ON s.id = (SELECT x.id FROM standing_event x WHERE x.revision_id = r.id ORDER BY x.id DESC LIMIT 1)
JOIN revision_content c
  ON c.id = (SELECT y.id FROM revision_content y WHERE y.revision_id = r.id ORDER BY y.iteration DESC LIMIT 1);
--> statement-breakpoint
-- Words of the latest content of each revision of a correlation; rowid is the revision's id.
CREATE VIRTUAL TABLE register_search USING fts5 (
  title, authors, geometry, summary, symbols, cautions, sources,
  tokenize = 'unicode61 remove_diacritics 2'
);
