-- The records file: what the plant is now, and the journal of how it came to be so.
--
-- Lengths are whole micrometres (_um), losses whole microdecibels (_udb), wavelengths whole picometres (_pm), so
-- that a foot, a hundredth of a decibel and a tenth of a nanometre are exact. Dates are 2026-03-31, times
-- 2026-03-31T19:05:00.000000Z. Lists of codes are parted by spaces, lists of numbers are ranges: 1-12,25.
--
-- Every table of records has one row a record, and its id is the record's lasting identity, never given twice;
-- codes and places in an order are attributes that a posting may change. References are deferred: a posting is
-- judged as a whole, whatever the order of its changes.

CREATE TABLE setting (
    id INTEGER PRIMARY KEY,
    name TEXT NOT NULL UNIQUE,
    value TEXT NOT NULL
) STRICT;

CREATE TABLE structure (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    kind TEXT NOT NULL,
    lon REAL NOT NULL CHECK (lon BETWEEN -180 AND 180),
    lat REAL NOT NULL CHECK (lat BETWEEN -90 AND 90),
    accuracy_um INTEGER,
    address TEXT,
    state TEXT NOT NULL,
    shared_risk TEXT NOT NULL,
    note TEXT
) STRICT;

CREATE TABLE span (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    from_structure INTEGER NOT NULL REFERENCES structure DEFERRABLE INITIALLY DEFERRED,
    to_structure INTEGER NOT NULL REFERENCES structure DEFERRABLE INITIALLY DEFERRED,
    placement TEXT NOT NULL,
    measured_length_um INTEGER, -- where measured; else the line's, else the geodesic's
    line TEXT, -- WKT in lon lat
    state TEXT NOT NULL,
    shared_risk TEXT NOT NULL,
    note TEXT
) STRICT;
-- An index on each column that refers: without it the removal of what is referred to reads the whole table.
CREATE INDEX span_from ON span (from_structure);
CREATE INDEX span_to ON span (to_structure);

CREATE TABLE fiber_type (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    by_wavelength TEXT NOT NULL, -- wavelength_pm loss_udb_per_km limit_udb_per_km group_index or -; parted by ;
    zero_dispersion_nm REAL,
    dispersion_slope REAL, -- ps/(nm2 km)
    pmd_ps_per_sqrt_km REAL
) STRICT;

CREATE TABLE color_code (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    colors TEXT NOT NULL -- from position 1 on, parted by ; (one within a word is \;)
) STRICT;

CREATE TABLE cable_type (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    fibers INTEGER NOT NULL CHECK (fibers > 0),
    fibers_per_tube INTEGER NOT NULL CHECK (fibers_per_tube > 0),
    fiber_type TEXT NOT NULL, -- by code: the built-in ones are not records
    overlength_pct REAL NOT NULL,
    ribbon INTEGER NOT NULL CHECK (ribbon = 0 OR ribbon = 1),
    fibers_per_ribbon INTEGER,
    colors TEXT NOT NULL -- by code, as fiber_type
) STRICT;

CREATE TABLE cable (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    cable_type INTEGER NOT NULL REFERENCES cable_type DEFERRABLE INITIALLY DEFERRED,
    part_of TEXT, -- the name of a longer cable, which is no record of its own
    marks_ink TEXT NOT NULL,
    overlength_pct REAL,
    reel TEXT,
    installed_on TEXT,
    state TEXT NOT NULL,
    note TEXT
) STRICT;
CREATE INDEX cable_of_type ON cable (cable_type);

CREATE TABLE cable_value (
    id INTEGER PRIMARY KEY,
    cable INTEGER NOT NULL REFERENCES cable DEFERRABLE INITIALLY DEFERRED,
    wavelength_pm INTEGER NOT NULL,
    group_index REAL,
    loss_udb_per_km INTEGER,
    source TEXT
) STRICT;
CREATE INDEX cable_value_of_cable ON cable_value (cable);

CREATE TABLE run_row (
    id INTEGER PRIMARY KEY,
    cable INTEGER NOT NULL REFERENCES cable DEFERRABLE INITIALLY DEFERRED,
    seq INTEGER NOT NULL CHECK (seq >= 0),
    structure INTEGER NOT NULL REFERENCES structure DEFERRABLE INITIALLY DEFERRED,
    span INTEGER REFERENCES span DEFERRABLE INITIALLY DEFERRED,
    slack_um INTEGER NOT NULL CHECK (slack_um >= 0),
    slack_trust TEXT NOT NULL,
    slack_on TEXT,
    duct TEXT,
    UNIQUE (cable, seq)
) STRICT;
CREATE INDEX run_row_at_structure ON run_row (structure);
CREATE INDEX run_row_over_span ON run_row (span);

CREATE TABLE sheath_mark (
    id INTEGER PRIMARY KEY,
    run_row INTEGER NOT NULL REFERENCES run_row DEFERRABLE INITIALLY DEFERRED,
    ink TEXT NOT NULL,
    unit TEXT NOT NULL,
    mark_in TEXT, -- as printed: 1049.50 keeps its last zero
    mark_out TEXT,
    read_on TEXT,
    trust TEXT NOT NULL
) STRICT;
CREATE INDEX sheath_mark_at_row ON sheath_mark (run_row);

CREATE TABLE enclosure (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    structure INTEGER NOT NULL REFERENCES structure DEFERRABLE INITIALLY DEFERRED,
    kind TEXT NOT NULL,
    tray_glass_um INTEGER NOT NULL,
    state TEXT NOT NULL,
    note TEXT
) STRICT;
CREATE INDEX enclosure_in_structure ON enclosure (structure);

CREATE TABLE pass (
    id INTEGER PRIMARY KEY,
    enclosure INTEGER NOT NULL REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    cable INTEGER NOT NULL REFERENCES cable DEFERRABLE INITIALLY DEFERRED,
    run_row INTEGER NOT NULL UNIQUE REFERENCES run_row DEFERRABLE INITIALLY DEFERRED, -- one enclosure at most
    opened TEXT NOT NULL,
    tubes_opened TEXT NOT NULL
) STRICT;
CREATE INDEX pass_in_enclosure ON pass (enclosure);
CREATE INDEX pass_of_cable ON pass (cable);

CREATE TABLE splitter (
    id INTEGER PRIMARY KEY,
    enclosure INTEGER NOT NULL REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    code TEXT NOT NULL,
    inputs INTEGER NOT NULL CHECK (inputs = 1 OR inputs = 2),
    outputs INTEGER NOT NULL CHECK (outputs BETWEEN 2 AND 128),
    loss_udb INTEGER,
    output_losses TEXT NOT NULL, -- output=loss_udb, parted by spaces; of unequal taps only
    UNIQUE (enclosure, code)
) STRICT;

CREATE TABLE panel (
    id INTEGER PRIMARY KEY,
    enclosure INTEGER NOT NULL REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    code TEXT NOT NULL,
    ports INTEGER NOT NULL CHECK (ports > 0),
    connector TEXT NOT NULL,
    UNIQUE (enclosure, code)
) STRICT;

-- A range of joints made alike: ends a_first..a_last of one leg joined in order to b_first..b_last of another. A
-- leg is a run row (back, ahead), a splitter (in, out) or a panel (rear, front), as its side says. The words are
-- compared one by one: for a list of them (IN) SQLite would build an index for each row added.
CREATE TABLE joint (
    id INTEGER PRIMARY KEY,
    kind TEXT NOT NULL,
    enclosure INTEGER NOT NULL REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    a_side TEXT NOT NULL CHECK (a_side = 'back' OR a_side = 'ahead' OR a_side = 'in'
        OR a_side = 'out' OR a_side = 'rear' OR a_side = 'front'),
    a_leg INTEGER NOT NULL,
    a_first INTEGER NOT NULL,
    a_last INTEGER NOT NULL,
    b_side TEXT NOT NULL CHECK (b_side = 'back' OR b_side = 'ahead' OR b_side = 'in'
        OR b_side = 'out' OR b_side = 'rear' OR b_side = 'front'),
    b_leg INTEGER NOT NULL,
    b_first INTEGER NOT NULL,
    b_last INTEGER NOT NULL,
    tray TEXT,
    method TEXT,
    loss_udb INTEGER,
    trust TEXT NOT NULL,
    verified_on TEXT,
    spliced_on TEXT,
    spliced_by TEXT,
    temporary_until TEXT,
    job TEXT,
    jumper_length_um INTEGER,
    CHECK (a_last - a_first = b_last - b_first OR a_last - a_first = b_first - b_last)
) STRICT;
CREATE INDEX joint_in_enclosure ON joint (enclosure);

-- Both ends of every single joint in the glass: its primary key is what lets an end be joined once, whichever side
-- of a joint it stands on, and never to itself. A key holds the leg's side (back 0, ahead 1, in 2, out 3, rear 4,
-- front 5) in bits 56 to 58, the leg in bits 24 to 55, the number in bits 0 to 23. To what an end is joined the joint
-- says. It is not declared a reference: that would need an index as large as the table, and both are written from the
-- same record.
CREATE TABLE joined_end (
    end_key INTEGER PRIMARY KEY,
    joint INTEGER NOT NULL
) STRICT;

-- The same for joints that are planned only: within its job an end is used once.
CREATE TABLE planned_end (
    job TEXT NOT NULL,
    end_key INTEGER NOT NULL,
    peer_key INTEGER NOT NULL,
    joint INTEGER NOT NULL,
    PRIMARY KEY (job, end_key),
    CHECK (end_key <> peer_key)
) STRICT, WITHOUT ROWID;

CREATE TABLE end_state (
    id INTEGER PRIMARY KEY,
    enclosure INTEGER NOT NULL REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    side TEXT NOT NULL CHECK (side = 'back' OR side = 'ahead' OR side = 'in'
        OR side = 'out' OR side = 'rear' OR side = 'front'),
    leg INTEGER NOT NULL,
    first_end INTEGER NOT NULL,
    last_end INTEGER NOT NULL,
    condition TEXT NOT NULL,
    trust TEXT NOT NULL,
    verified_on TEXT
) STRICT;
CREATE INDEX end_state_in_enclosure ON end_state (enclosure);

CREATE TABLE measurement (
    id INTEGER PRIMARY KEY,
    what TEXT NOT NULL,
    wavelength_pm INTEGER NOT NULL,
    direction TEXT, -- ab, ba, or nothing where nobody said
    loss_udb INTEGER NOT NULL,
    measured_on TEXT,
    measured_by TEXT,
    file TEXT
) STRICT;

CREATE TABLE fiber_flag (
    id INTEGER PRIMARY KEY,
    cable INTEGER NOT NULL REFERENCES cable DEFERRABLE INITIALLY DEFERRED,
    first_fiber INTEGER NOT NULL,
    last_fiber INTEGER NOT NULL,
    flag TEXT NOT NULL,
    from_enclosure INTEGER REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    to_enclosure INTEGER REFERENCES enclosure DEFERRABLE INITIALLY DEFERRED,
    owner TEXT,
    reason TEXT,
    until TEXT
) STRICT;
CREATE INDEX fiber_flag_of_cable ON fiber_flag (cable);
CREATE INDEX fiber_flag_from ON fiber_flag (from_enclosure);
CREATE INDEX fiber_flag_to ON fiber_flag (to_enclosure);

CREATE TABLE fiber_count (
    id INTEGER PRIMARY KEY,
    cable INTEGER NOT NULL REFERENCES cable DEFERRABLE INITIALLY DEFERRED,
    first_fiber INTEGER NOT NULL,
    last_fiber INTEGER NOT NULL,
    name TEXT NOT NULL,
    first_number INTEGER NOT NULL,
    last_number INTEGER NOT NULL
) STRICT;
CREATE INDEX fiber_count_of_cable ON fiber_count (cable);

CREATE TABLE circuit (
    id INTEGER PRIMARY KEY,
    code TEXT NOT NULL UNIQUE,
    service TEXT,
    customer TEXT,
    priority INTEGER NOT NULL CHECK (priority BETWEEN 1 AND 5),
    customers_served INTEGER NOT NULL,
    wavelengths_pm TEXT NOT NULL, -- the default first, parted by spaces
    budget TEXT,
    protection_group TEXT,
    a_panel INTEGER NOT NULL REFERENCES panel DEFERRABLE INITIALLY DEFERRED,
    a_first INTEGER NOT NULL,
    a_last INTEGER NOT NULL,
    z_panel INTEGER NOT NULL REFERENCES panel DEFERRABLE INITIALLY DEFERRED,
    z_first INTEGER NOT NULL,
    z_last INTEGER NOT NULL,
    status TEXT NOT NULL,
    CHECK (a_last - a_first = z_last - z_first OR a_last - a_first = z_first - z_last)
) STRICT;
CREATE INDEX circuit_at_a ON circuit (a_panel);
CREATE INDEX circuit_at_z ON circuit (z_panel);

-- The fronts of ports that are in use: a front takes one jumper, or else any number of circuits' ends (retired
-- circuits use nothing), never both.
CREATE TABLE front_use (
    end_key INTEGER PRIMARY KEY,
    jumpers INTEGER NOT NULL CHECK (jumpers = 0 OR jumpers = 1),
    circuit_ends INTEGER NOT NULL CHECK (circuit_ends >= 0),
    CHECK (jumpers = 0 OR circuit_ends = 0)
) STRICT;

CREATE TABLE planning_value (
    id INTEGER PRIMARY KEY,
    item TEXT NOT NULL UNIQUE,
    expected_udb INTEGER NOT NULL,
    limit_udb INTEGER,
    sd_udb INTEGER,
    source TEXT
) STRICT;

CREATE TABLE base_feature (
    id INTEGER PRIMARY KEY,
    layer TEXT NOT NULL,
    name TEXT,
    geometry BLOB NOT NULL -- WKB in lon lat
) STRICT;

-- One more than the largest identity of a record that was removed from a table: with those that are there it says
-- which identities have been given. A posting that removes nothing leaves it as it is.
CREATE TABLE next_identity (
    of_table TEXT PRIMARY KEY,
    id INTEGER NOT NULL
) STRICT, WITHOUT ROWID;

-- The heads of all postings, numbered without gaps.
CREATE TABLE posting (
    number INTEGER PRIMARY KEY CHECK (number > 0),
    posted_at TEXT NOT NULL,
    posted_by TEXT NOT NULL,
    reason TEXT NOT NULL,
    changes INTEGER NOT NULL,
    hash BLOB NOT NULL, -- SHA-256 over the hash before, this head and its pages: names the whole history
    of_table TEXT, -- of a small posting its only page, else nothing
    rows BLOB,
    CHECK ((of_table IS NULL) = (rows IS NULL))
) STRICT;

-- What each posting changed, in order, but for a small posting's only page: pages of rows of one table, each before
-- and after. A page names its own columns, so that it can be read whatever becomes of the tables above.
CREATE TABLE posting_page (
    posting INTEGER NOT NULL REFERENCES posting DEFERRABLE INITIALLY DEFERRED,
    page INTEGER NOT NULL,
    of_table TEXT NOT NULL,
    rows BLOB NOT NULL,
    PRIMARY KEY (posting, page)
) STRICT, WITHOUT ROWID;
