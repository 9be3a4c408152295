-- What is written in these tables stays as it was written. Set after every migration and checked at every start.
--
-- INSERT OR REPLACE deletes the row in its way without asking a DELETE trigger, so a BEFORE INSERT trigger refuses
-- every key that is taken, the hidden rowid included (it is -1 in the trigger when none was given).

CREATE TRIGGER journal_keeps_rows BEFORE UPDATE ON journal
BEGIN
  SELECT RAISE(ABORT, 'journal entries cannot be changed');
END;

CREATE TRIGGER journal_keeps_all BEFORE DELETE ON journal
BEGIN
  SELECT RAISE(ABORT, 'journal entries cannot be removed');
END;

CREATE TRIGGER journal_keeps_places BEFORE INSERT ON journal
WHEN EXISTS (SELECT 1 FROM journal WHERE "index" = NEW."index")
BEGIN
  SELECT RAISE(ABORT, 'journal entries cannot be replaced');
END;

CREATE TRIGGER journal_node_keeps_rows BEFORE UPDATE ON journal_node
BEGIN
  SELECT RAISE(ABORT, 'journal hashes cannot be changed');
END;

CREATE TRIGGER journal_node_keeps_all BEFORE DELETE ON journal_node
BEGIN
  SELECT RAISE(ABORT, 'journal hashes cannot be removed');
END;

CREATE TRIGGER journal_node_keeps_places BEFORE INSERT ON journal_node
WHEN EXISTS (SELECT 1 FROM journal_node WHERE level = NEW.level AND position = NEW.position)
  OR EXISTS (SELECT 1 FROM journal_node WHERE rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'journal hashes cannot be replaced');
END;

CREATE TRIGGER journal_checkpoint_keeps_rows BEFORE UPDATE ON journal_checkpoint
BEGIN
  SELECT RAISE(ABORT, 'checkpoints cannot be changed');
END;

CREATE TRIGGER journal_checkpoint_keeps_all BEFORE DELETE ON journal_checkpoint
BEGIN
  SELECT RAISE(ABORT, 'checkpoints cannot be removed');
END;

CREATE TRIGGER journal_checkpoint_keeps_places BEFORE INSERT ON journal_checkpoint
WHEN EXISTS (SELECT 1 FROM journal_checkpoint WHERE size = NEW.size)
BEGIN
  SELECT RAISE(ABORT, 'checkpoints cannot be replaced');
END;

CREATE TRIGGER journal_key_keeps_rows BEFORE UPDATE ON journal_key
BEGIN
  SELECT RAISE(ABORT, 'keys of the journal cannot be changed');
END;

CREATE TRIGGER journal_key_keeps_all BEFORE DELETE ON journal_key
BEGIN
  SELECT RAISE(ABORT, 'keys of the journal cannot be removed');
END;

CREATE TRIGGER journal_key_keeps_places BEFORE INSERT ON journal_key
WHEN EXISTS (SELECT 1 FROM journal_key WHERE key_id = NEW.key_id)
  OR EXISTS (SELECT 1 FROM journal_key WHERE rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'keys of the journal cannot be replaced');
END;

-- The office is founded once.

CREATE TRIGGER office_keeps_row BEFORE UPDATE ON office
BEGIN
  SELECT RAISE(ABORT, 'the office cannot be founded anew');
END;

CREATE TRIGGER office_keeps_all BEFORE DELETE ON office
BEGIN
  SELECT RAISE(ABORT, 'the office cannot be removed');
END;

CREATE TRIGGER office_keeps_place BEFORE INSERT ON office
WHEN EXISTS (SELECT 1 FROM office)
BEGIN
  SELECT RAISE(ABORT, 'the office was founded already');
END;

-- Nobody is administrator and technical authority at once; and people stay, since records name them.

CREATE TRIGGER person_keeps_all BEFORE DELETE ON person
BEGIN
  SELECT RAISE(ABORT, 'people are made inactive, not removed');
END;

CREATE TRIGGER person_keeps_places BEFORE INSERT ON person
WHEN EXISTS (SELECT 1 FROM person WHERE id = NEW.id OR email = NEW.email OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'this person exists already');
END;

CREATE TRIGGER person_role_stays_apart BEFORE INSERT ON person_role
WHEN (NEW.role = 'administrator'
    AND EXISTS (SELECT 1 FROM person_role WHERE person_id = NEW.person_id AND role = 'authority'))
  OR (NEW.role = 'authority'
    AND EXISTS (SELECT 1 FROM person_role WHERE person_id = NEW.person_id AND role = 'administrator'))
BEGIN
  SELECT RAISE(ABORT, 'an administrator cannot be a technical authority');
END;

CREATE TRIGGER person_role_stays_as_given BEFORE UPDATE ON person_role
BEGIN
  SELECT RAISE(ABORT, 'roles are given and taken, not changed');
END;

-- The register: what a revision said, what standing it had, and who signed what, stays as it was written.

CREATE TRIGGER revision_content_keeps_rows BEFORE UPDATE ON revision_content
BEGIN
  SELECT RAISE(ABORT, 'what a revision said cannot be changed');
END;

CREATE TRIGGER revision_content_keeps_all BEFORE DELETE ON revision_content
BEGIN
  SELECT RAISE(ABORT, 'what a revision said cannot be removed');
END;

CREATE TRIGGER revision_content_keeps_places BEFORE INSERT ON revision_content
WHEN EXISTS (SELECT 1 FROM revision_content WHERE id = NEW.id OR (revision_id = NEW.revision_id AND iteration = NEW.iteration))
BEGIN
  SELECT RAISE(ABORT, 'what a revision said cannot be replaced');
END;

CREATE TRIGGER standing_event_keeps_rows BEFORE UPDATE ON standing_event
BEGIN
  SELECT RAISE(ABORT, 'standings cannot be changed');
END;

CREATE TRIGGER standing_event_keeps_all BEFORE DELETE ON standing_event
BEGIN
  SELECT RAISE(ABORT, 'standings cannot be removed');
END;

CREATE TRIGGER standing_event_keeps_places BEFORE INSERT ON standing_event
WHEN EXISTS (SELECT 1 FROM standing_event WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'standings cannot be replaced');
END;

CREATE TRIGGER submission_keeps_rows BEFORE UPDATE ON submission
BEGIN
  SELECT RAISE(ABORT, 'submissions cannot be changed');
END;

CREATE TRIGGER submission_keeps_all BEFORE DELETE ON submission
BEGIN
  SELECT RAISE(ABORT, 'submissions cannot be removed');
END;

CREATE TRIGGER submission_keeps_places BEFORE INSERT ON submission
WHEN EXISTS (SELECT 1 FROM submission WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'submissions cannot be replaced');
END;

CREATE TRIGGER review_keeps_rows BEFORE UPDATE ON review
BEGIN
  SELECT RAISE(ABORT, 'reviews cannot be changed');
END;

CREATE TRIGGER review_keeps_all BEFORE DELETE ON review
BEGIN
  SELECT RAISE(ABORT, 'reviews cannot be removed');
END;

CREATE TRIGGER review_keeps_places BEFORE INSERT ON review
WHEN EXISTS (SELECT 1 FROM review WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'reviews cannot be replaced');
END;

CREATE TRIGGER review_assignment_keeps_rows BEFORE UPDATE ON review_assignment
BEGIN
  SELECT RAISE(ABORT, 'assignments of reviewers cannot be changed');
END;

CREATE TRIGGER review_assignment_keeps_all BEFORE DELETE ON review_assignment
BEGIN
  SELECT RAISE(ABORT, 'assignments of reviewers cannot be removed');
END;

CREATE TRIGGER review_assignment_keeps_places BEFORE INSERT ON review_assignment
WHEN EXISTS (SELECT 1 FROM review_assignment WHERE id = NEW.id OR (revision_id = NEW.revision_id AND reviewer_id = NEW.reviewer_id))
BEGIN
  SELECT RAISE(ABORT, 'assignments of reviewers cannot be replaced');
END;

CREATE TRIGGER comment_keeps_rows BEFORE UPDATE ON comment
BEGIN
  SELECT RAISE(ABORT, 'comments cannot be changed');
END;

CREATE TRIGGER comment_keeps_all BEFORE DELETE ON comment
BEGIN
  SELECT RAISE(ABORT, 'comments cannot be removed');
END;

CREATE TRIGGER comment_keeps_places BEFORE INSERT ON comment
WHEN EXISTS (SELECT 1 FROM comment WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'comments cannot be replaced');
END;

CREATE TRIGGER approval_keeps_rows BEFORE UPDATE ON approval
BEGIN
  SELECT RAISE(ABORT, 'approvals cannot be changed');
END;

CREATE TRIGGER approval_keeps_all BEFORE DELETE ON approval
BEGIN
  SELECT RAISE(ABORT, 'approvals cannot be removed');
END;

CREATE TRIGGER approval_keeps_places BEFORE INSERT ON approval
WHEN EXISTS (SELECT 1 FROM approval WHERE id = NEW.id OR revision_id = NEW.revision_id)
BEGIN
  SELECT RAISE(ABORT, 'approvals cannot be replaced');
END;

CREATE TRIGGER comment_answer_keeps_rows BEFORE UPDATE ON comment_answer
BEGIN
  SELECT RAISE(ABORT, 'answers to comments cannot be changed');
END;

CREATE TRIGGER comment_answer_keeps_all BEFORE DELETE ON comment_answer
BEGIN
  SELECT RAISE(ABORT, 'answers to comments cannot be removed');
END;

CREATE TRIGGER comment_answer_keeps_places BEFORE INSERT ON comment_answer
WHEN EXISTS (SELECT 1 FROM comment_answer WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'answers to comments cannot be replaced');
END;

CREATE TRIGGER comment_resolution_keeps_rows BEFORE UPDATE ON comment_resolution
BEGIN
  SELECT RAISE(ABORT, 'resolutions of comments cannot be changed');
END;

CREATE TRIGGER comment_resolution_keeps_all BEFORE DELETE ON comment_resolution
BEGIN
  SELECT RAISE(ABORT, 'resolutions of comments cannot be removed');
END;

CREATE TRIGGER comment_resolution_keeps_places BEFORE INSERT ON comment_resolution
WHEN EXISTS (SELECT 1 FROM comment_resolution WHERE id = NEW.id OR comment_id = NEW.comment_id)
BEGIN
  SELECT RAISE(ABORT, 'resolutions of comments cannot be replaced');
END;

CREATE TRIGGER problem_report_keeps_rows BEFORE UPDATE ON problem_report
BEGIN
  SELECT RAISE(ABORT, 'problem reports cannot be changed');
END;

CREATE TRIGGER problem_report_keeps_all BEFORE DELETE ON problem_report
BEGIN
  SELECT RAISE(ABORT, 'problem reports cannot be removed');
END;

CREATE TRIGGER problem_report_keeps_places BEFORE INSERT ON problem_report
WHEN EXISTS (SELECT 1 FROM problem_report WHERE id = NEW.id)
BEGIN
  SELECT RAISE(ABORT, 'problem reports cannot be replaced');
END;

CREATE TRIGGER problem_report_answer_keeps_rows BEFORE UPDATE ON problem_report_answer
BEGIN
  SELECT RAISE(ABORT, 'answers to problem reports cannot be changed');
END;

CREATE TRIGGER problem_report_answer_keeps_all BEFORE DELETE ON problem_report_answer
BEGIN
  SELECT RAISE(ABORT, 'answers to problem reports cannot be removed');
END;

CREATE TRIGGER problem_report_answer_keeps_places BEFORE INSERT ON problem_report_answer
WHEN EXISTS (SELECT 1 FROM problem_report_answer WHERE id = NEW.id OR report_id = NEW.report_id)
BEGIN
  SELECT RAISE(ABORT, 'answers to problem reports cannot be replaced');
END;

-- What another office handed over with its register stays as it came.

CREATE TRIGGER former_person_keeps_rows BEFORE UPDATE ON former_person
BEGIN
  SELECT RAISE(ABORT, 'people of a former office cannot be changed');
END;

CREATE TRIGGER former_person_keeps_all BEFORE DELETE ON former_person
BEGIN
  SELECT RAISE(ABORT, 'people of a former office cannot be removed');
END;

CREATE TRIGGER former_person_keeps_places BEFORE INSERT ON former_person
WHEN EXISTS (SELECT 1 FROM former_person WHERE id = NEW.id OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'people of a former office cannot be replaced');
END;

CREATE TRIGGER former_journal_keeps_rows BEFORE UPDATE ON former_journal
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be changed');
END;

CREATE TRIGGER former_journal_keeps_all BEFORE DELETE ON former_journal
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be removed');
END;

CREATE TRIGGER former_journal_keeps_places BEFORE INSERT ON former_journal
WHEN EXISTS (SELECT 1 FROM former_journal WHERE place = NEW.place)
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be replaced');
END;

CREATE TRIGGER former_journal_entry_keeps_rows BEFORE UPDATE ON former_journal_entry
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be changed');
END;

CREATE TRIGGER former_journal_entry_keeps_all BEFORE DELETE ON former_journal_entry
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be removed');
END;

CREATE TRIGGER former_journal_entry_keeps_places BEFORE INSERT ON former_journal_entry
WHEN EXISTS (SELECT 1 FROM former_journal_entry WHERE (place = NEW.place AND "index" = NEW."index") OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'journals of a former office cannot be replaced');
END;

CREATE TRIGGER evaluation_keeps_rows BEFORE UPDATE ON evaluation
BEGIN
  SELECT RAISE(ABORT, 'kept evaluations cannot be changed');
END;

CREATE TRIGGER evaluation_keeps_all BEFORE DELETE ON evaluation
BEGIN
  SELECT RAISE(ABORT, 'kept evaluations cannot be removed');
END;

CREATE TRIGGER evaluation_keeps_places BEFORE INSERT ON evaluation
WHEN EXISTS (SELECT 1 FROM evaluation WHERE id = NEW.id OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'kept evaluations cannot be replaced');
END;

CREATE TRIGGER correlation_keeps_rows BEFORE UPDATE ON correlation
BEGIN
  SELECT RAISE(ABORT, 'correlations cannot be changed');
END;

CREATE TRIGGER correlation_keeps_all BEFORE DELETE ON correlation
BEGIN
  SELECT RAISE(ABORT, 'correlations cannot be removed');
END;

CREATE TRIGGER correlation_keeps_places BEFORE INSERT ON correlation
WHEN EXISTS (SELECT 1 FROM correlation WHERE id = NEW.id OR slug = NEW.slug)
BEGIN
  SELECT RAISE(ABORT, 'correlations cannot be replaced');
END;

CREATE TRIGGER property_equation_keeps_rows BEFORE UPDATE ON property_equation
BEGIN
  SELECT RAISE(ABORT, 'property equations cannot be changed');
END;

CREATE TRIGGER property_equation_keeps_all BEFORE DELETE ON property_equation
BEGIN
  SELECT RAISE(ABORT, 'property equations cannot be removed');
END;

CREATE TRIGGER property_equation_keeps_places BEFORE INSERT ON property_equation
WHEN EXISTS (SELECT 1 FROM property_equation WHERE id = NEW.id OR slug = NEW.slug)
BEGIN
  SELECT RAISE(ABORT, 'property equations cannot be replaced');
END;

-- A revision keeps its identity; only a draft that came with the library gets an originator.

CREATE TRIGGER revision_keeps_identity BEFORE UPDATE ON revision
WHEN OLD.id <> NEW.id
  OR OLD.correlation_id IS NOT NEW.correlation_id
  OR OLD.property_equation_id IS NOT NEW.property_equation_id
  OR OLD.number <> NEW.number
  OR OLD.created_at <> NEW.created_at
  OR OLD.originator_id <> 'system'
BEGIN
  SELECT RAISE(ABORT, 'revisions cannot be changed');
END;

CREATE TRIGGER revision_keeps_all BEFORE DELETE ON revision
BEGIN
  SELECT RAISE(ABORT, 'revisions cannot be removed');
END;

CREATE TRIGGER revision_keeps_places BEFORE INSERT ON revision
WHEN EXISTS (
  SELECT 1 FROM revision
  WHERE id = NEW.id
    OR (correlation_id = NEW.correlation_id AND number = NEW.number)
    OR (property_equation_id = NEW.property_equation_id AND number = NEW.number)
)
BEGIN
  SELECT RAISE(ABORT, 'revisions cannot be replaced');
END;

-- Content is frozen with the first standing that is neither draft nor in review.

CREATE TRIGGER revision_content_is_frozen BEFORE INSERT ON revision_content
WHEN EXISTS (
  SELECT 1 FROM standing_event
  WHERE revision_id = NEW.revision_id AND standing NOT IN ('draft', 'in review')
)
BEGIN
  SELECT RAISE(ABORT, 'the content of this revision is frozen');
END;

-- Attached documents stay as they were put; only where one may go can be set anew.

CREATE TRIGGER attachment_keeps_rows BEFORE UPDATE ON attachment
WHEN OLD.rowid <> NEW.rowid
  OR OLD.id <> NEW.id
  OR OLD.owner_kind <> NEW.owner_kind
  OR OLD.owner_id <> NEW.owner_id
  OR OLD.source IS NOT NEW.source
  OR OLD.name <> NEW.name
  OR OLD.media_type <> NEW.media_type
  OR OLD.size <> NEW.size
  OR OLD.sha256 <> NEW.sha256
  OR OLD.active_content <> NEW.active_content
  OR OLD.at <> NEW.at
  OR OLD.by_id <> NEW.by_id
  OR OLD.by_name <> NEW.by_name
BEGIN
  SELECT RAISE(ABORT, 'attached documents cannot be changed');
END;

CREATE TRIGGER attachment_keeps_all BEFORE DELETE ON attachment
BEGIN
  SELECT RAISE(ABORT, 'attached documents cannot be removed');
END;

CREATE TRIGGER attachment_keeps_places BEFORE INSERT ON attachment
WHEN EXISTS (
  SELECT 1 FROM attachment
  WHERE id = NEW.id
    OR rowid = NEW.rowid
    OR (owner_kind = NEW.owner_kind AND owner_id = NEW.owner_id AND sha256 = NEW.sha256)
)
BEGIN
  SELECT RAISE(ABORT, 'attached documents cannot be replaced');
END;

-- An appointment is proposed once, confirmed once and ended once; what was written of each stays.

CREATE TRIGGER appointment_keeps_rows BEFORE UPDATE ON appointment
WHEN OLD.id <> NEW.id
  OR OLD.person_id <> NEW.person_id
  OR OLD.geometries IS NOT NEW.geometries
  OR OLD.until <> NEW.until
  OR OLD.proposed_at <> NEW.proposed_at
  OR OLD.proposed_by_id <> NEW.proposed_by_id
  OR OLD.proposed_by_name <> NEW.proposed_by_name
  OR OLD.ended_at IS NOT NULL
  OR (OLD.confirmed_at IS NOT NULL AND (
    OLD.confirmed_at IS NOT NEW.confirmed_at
    OR OLD.confirmed_by_id IS NOT NEW.confirmed_by_id
    OR OLD.confirmed_by_name IS NOT NEW.confirmed_by_name))
BEGIN
  SELECT RAISE(ABORT, 'appointments cannot be changed');
END;

CREATE TRIGGER appointment_is_confirmed_by_others BEFORE UPDATE ON appointment
WHEN NEW.confirmed_by_id IN (NEW.person_id, NEW.proposed_by_id)
BEGIN
  SELECT RAISE(ABORT, 'an appointment is confirmed by a second person');
END;

CREATE TRIGGER appointment_begins_proposed BEFORE INSERT ON appointment
WHEN NEW.confirmed_at IS NOT NULL OR NEW.confirmed_by_id IS NOT NULL OR NEW.person_id = NEW.proposed_by_id
BEGIN
  SELECT RAISE(ABORT, 'an appointment is proposed by somebody else and then confirmed');
END;

CREATE TRIGGER appointment_keeps_all BEFORE DELETE ON appointment
BEGIN
  SELECT RAISE(ABORT, 'appointments cannot be removed');
END;

CREATE TRIGGER appointment_keeps_places BEFORE INSERT ON appointment
WHEN EXISTS (SELECT 1 FROM appointment WHERE id = NEW.id OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'appointments cannot be replaced');
END;

-- A link that lets somebody in is over once it was used or replaced.

CREATE TRIGGER one_time_link_ends_once BEFORE UPDATE ON one_time_link
WHEN OLD.ended_at IS NOT NULL
  OR NEW.ended_at IS NULL
  OR OLD.token_hash <> NEW.token_hash
  OR OLD.purpose <> NEW.purpose
  OR OLD.person_id IS NOT NEW.person_id
  OR OLD.made_at <> NEW.made_at
  OR OLD.expires_at <> NEW.expires_at
BEGIN
  SELECT RAISE(ABORT, 'a link that lets somebody in cannot be changed');
END;

CREATE TRIGGER one_time_link_keeps_places BEFORE INSERT ON one_time_link
WHEN EXISTS (SELECT 1 FROM one_time_link WHERE token_hash = NEW.token_hash OR rowid = NEW.rowid)
BEGIN
  SELECT RAISE(ABORT, 'a link that lets somebody in cannot be replaced');
END;
