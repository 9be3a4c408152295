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
