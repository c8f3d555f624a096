-- Sheets being written at the records desk. They are beside the records and not part of them: the journal does not hold
-- them. A draft's text is kept in versions, so that it can be undone after it was closed; saving beyond an undone one
-- takes what was undone away. Times are 2026-03-31T19:05:00.000000Z.

CREATE TABLE draft (
    id INTEGER PRIMARY KEY CHECK (id > 0),
    enclosure INTEGER NOT NULL, -- its identity; no reference, so that a draft never stands in the way of a posting
    author TEXT NOT NULL CHECK (author <> ''),
    begun_at TEXT NOT NULL,
    saved_at TEXT NOT NULL,
    revision INTEGER NOT NULL CHECK (revision > 0),
    base INTEGER NOT NULL CHECK (base >= 0), -- the last posting that its author has seen
    oldest INTEGER NOT NULL CHECK (oldest > 0),
    at INTEGER NOT NULL CHECK (at >= oldest), -- the version that stands
    newest INTEGER NOT NULL CHECK (newest >= at),
    state TEXT NOT NULL CHECK (state IN ('writing', 'submitted', 'posted', 'dropped')),
    submitted_by TEXT,
    posting INTEGER REFERENCES posting,
    fingerprint TEXT, -- what it said once it was posted
    CHECK ((state = 'posted') = (posting IS NOT NULL))
) STRICT;

CREATE TABLE draft_version (
    draft INTEGER NOT NULL REFERENCES draft,
    number INTEGER NOT NULL CHECK (number > 0),
    lines TEXT NOT NULL, -- parted by line feeds
    job TEXT,
    spliced_by TEXT,
    spliced_on TEXT,
    source TEXT,
    note TEXT,
    cursor_line INTEGER NOT NULL CHECK (cursor_line > 0),
    cursor_column INTEGER NOT NULL CHECK (cursor_column > 0),
    answers TEXT NOT NULL, -- rule, line, reason, each ended by a line feed
    PRIMARY KEY (draft, number)
) STRICT, WITHOUT ROWID;
