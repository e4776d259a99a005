-- The schema as it stands after all migrations; a test proves it. Instants are ticks of 100 ns since 1970-01-01T00:00:00Z.

CREATE TABLE content_version (
    id INTEGER PRIMARY KEY CHECK (id = 1),
    version INTEGER NOT NULL CHECK (version >= 0)
) STRICT;

INSERT INTO content_version (id, version) VALUES (1, 0);

CREATE TABLE station (
    id TEXT PRIMARY KEY CHECK (length(id) BETWEEN 1 AND 64),
    current_revision INTEGER NOT NULL CHECK (current_revision >= 1),
    is_demo INTEGER NOT NULL CHECK (is_demo IN (0, 1))
) STRICT;

CREATE TABLE station_revision (
    profile_id TEXT NOT NULL REFERENCES station (id) ON DELETE CASCADE,
    revision INTEGER NOT NULL CHECK (revision >= 1),
    document_json TEXT NOT NULL CHECK (json_valid(document_json)),
    saved_utc_ticks INTEGER NOT NULL,
    PRIMARY KEY (profile_id, revision)
) STRICT;

CREATE TABLE spacecraft (
    id TEXT PRIMARY KEY CHECK (length(id) BETWEEN 1 AND 64),
    current_revision INTEGER NOT NULL CHECK (current_revision >= 1),
    is_demo INTEGER NOT NULL CHECK (is_demo IN (0, 1)),
    catalog_number INTEGER NOT NULL CHECK (catalog_number BETWEEN 0 AND 999999999)
) STRICT;

CREATE INDEX spacecraft_by_catalog_number ON spacecraft (catalog_number);

CREATE TABLE spacecraft_revision (
    profile_id TEXT NOT NULL REFERENCES spacecraft (id) ON DELETE CASCADE,
    revision INTEGER NOT NULL CHECK (revision >= 1),
    document_json TEXT NOT NULL CHECK (json_valid(document_json)),
    saved_utc_ticks INTEGER NOT NULL,
    PRIMARY KEY (profile_id, revision)
) STRICT;

CREATE TABLE element_set (
    id INTEGER PRIMARY KEY,
    spacecraft_id TEXT NOT NULL REFERENCES spacecraft (id) ON DELETE RESTRICT,
    catalog_number INTEGER NOT NULL CHECK (catalog_number BETWEEN 0 AND 999999999),
    name TEXT NOT NULL,
    international_designator TEXT NOT NULL,
    classification TEXT NOT NULL CHECK (length(classification) = 1),
    epoch_utc_ticks INTEGER NOT NULL,
    mean_motion_rev_per_day REAL NOT NULL CHECK (mean_motion_rev_per_day > 0),
    eccentricity REAL NOT NULL CHECK (eccentricity >= 0 AND eccentricity < 1),
    inclination_deg REAL NOT NULL CHECK (inclination_deg BETWEEN 0 AND 180),
    right_ascension_of_node_deg REAL NOT NULL,
    argument_of_perigee_deg REAL NOT NULL,
    mean_anomaly_deg REAL NOT NULL,
    b_star_per_earth_radius REAL NOT NULL,
    mean_motion_dot_rev_per_day2 REAL NOT NULL,
    mean_motion_ddot_rev_per_day3 REAL NOT NULL,
    element_set_number INTEGER NOT NULL CHECK (element_set_number >= 0),
    revolution_number INTEGER NOT NULL CHECK (revolution_number >= 0),
    source TEXT NOT NULL,
    received_utc_ticks INTEGER NOT NULL,
    UNIQUE (
        spacecraft_id, epoch_utc_ticks, mean_motion_rev_per_day, eccentricity, inclination_deg,
        right_ascension_of_node_deg, argument_of_perigee_deg, mean_anomaly_deg, b_star_per_earth_radius
    )
) STRICT;

CREATE TABLE waveform (
    id TEXT PRIMARY KEY CHECK (length(id) BETWEEN 1 AND 64),
    document_json TEXT NOT NULL CHECK (json_valid(document_json)),
    saved_utc_ticks INTEGER NOT NULL
) STRICT;
