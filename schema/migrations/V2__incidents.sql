-- The incidents of the outage desk and their logs. They are beside the records and not part of them: no posting
-- makes them, and the journal does not hold them. Both tables only grow; an entry is corrected by a later one.
--
-- Times are 2026-03-31T19:05:00.000000Z, lists of codes are parted by spaces.

CREATE TABLE incident (
    id INTEGER PRIMARY KEY CHECK (id > 0),
    title TEXT NOT NULL CHECK (title <> ''),
    began_at TEXT NOT NULL,
    opened_at TEXT NOT NULL CHECK (opened_at >= began_at),
    opened_by TEXT NOT NULL CHECK (opened_by <> ''),
    cuts TEXT NOT NULL, -- kind:code
    down TEXT NOT NULL, -- circuits
    up TEXT NOT NULL, -- circuits
    reading TEXT,
    posting INTEGER NOT NULL REFERENCES posting -- the last one when it was opened
) STRICT;

CREATE TABLE incident_entry (
    incident INTEGER NOT NULL REFERENCES incident,
    number INTEGER NOT NULL CHECK (number > 0),
    kind TEXT NOT NULL CHECK (kind IN ('called', 'on_site', 'found', 'first_light', 'all_light', 'circuits_down',
        'circuits_back', 'stated', 'note', 'reading', 'closed', 'reopened')),
    happened_at TEXT NOT NULL,
    written_at TEXT NOT NULL,
    written_by TEXT NOT NULL CHECK (written_by <> ''),
    text TEXT,
    circuits TEXT NOT NULL,
    users INTEGER CHECK (users >= 0),
    oc3 TEXT, -- a plain decimal number
    corrects INTEGER CHECK (corrects < number), -- the entry in whose place it stands
    PRIMARY KEY (incident, number),
    UNIQUE (incident, corrects),
    FOREIGN KEY (incident, corrects) REFERENCES incident_entry (incident, number)
) STRICT, WITHOUT ROWID;

CREATE TRIGGER incident_stays BEFORE UPDATE ON incident
BEGIN
    SELECT RAISE(ABORT, 'an incident stays as it was opened');
END;

CREATE TRIGGER incident_is_kept BEFORE DELETE ON incident
BEGIN
    SELECT RAISE(ABORT, 'an incident is kept');
END;

CREATE TRIGGER incident_entry_stays BEFORE UPDATE ON incident_entry
BEGIN
    SELECT RAISE(ABORT, 'an entry stays as it was written; write another that corrects it');
END;

CREATE TRIGGER incident_entry_is_kept BEFORE DELETE ON incident_entry
BEGIN
    SELECT RAISE(ABORT, 'an entry is kept; write another that corrects it');
END;
