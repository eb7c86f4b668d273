/**
 * The first schema. `ord` numbers this device's acts in the order they were written; it names
 * nothing outside this file. Identities are (scope_id, session, seq).
 */
export const createProjects = `
CREATE TABLE sync_meta (key TEXT PRIMARY KEY, value TEXT NOT NULL) WITHOUT ROWID;
CREATE TABLE sync_scope (id TEXT PRIMARY KEY, kind TEXT NOT NULL) WITHOUT ROWID;
CREATE TABLE sync_session (id TEXT PRIMARY KEY, opened_ms INTEGER NOT NULL) WITHOUT ROWID;
CREATE TABLE request (id TEXT PRIMARY KEY, answer TEXT NOT NULL, at_ms INTEGER NOT NULL) WITHOUT ROWID;

CREATE TABLE outbox (
  ord INTEGER PRIMARY KEY,
  scope_id TEXT NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  time_ms INTEGER NOT NULL,
  kind TEXT NOT NULL,
  payload TEXT NOT NULL,
  UNIQUE (scope_id, session, seq)
);

CREATE TABLE project (
  scope_id TEXT PRIMARY KEY,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  example INTEGER NOT NULL,
  created_ms INTEGER NOT NULL,
  engine TEXT NOT NULL,
  request TEXT NOT NULL,
  edits TEXT NOT NULL,
  deleted INTEGER NOT NULL DEFAULT 0
) WITHOUT ROWID;
CREATE TABLE bin (
  scope_id TEXT NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  stamp_ms INTEGER NOT NULL,
  seen TEXT NOT NULL,
  PRIMARY KEY (scope_id, session, seq)
) WITHOUT ROWID;
CREATE TABLE field_write (
  scope_id TEXT NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  field TEXT NOT NULL,
  value TEXT NOT NULL,
  stamp_ms INTEGER NOT NULL,
  base_session TEXT,
  base_seq INTEGER,
  PRIMARY KEY (scope_id, session, seq, field)
) WITHOUT ROWID;

CREATE TABLE step (
  scope_id TEXT NOT NULL,
  key TEXT NOT NULL,
  position INTEGER NOT NULL,
  body TEXT NOT NULL,
  PRIMARY KEY (scope_id, key)
) WITHOUT ROWID;
CREATE TABLE lane (
  scope_id TEXT NOT NULL,
  step TEXT NOT NULL,
  key TEXT NOT NULL,
  position INTEGER NOT NULL,
  extra INTEGER NOT NULL,
  body TEXT NOT NULL,
  PRIMARY KEY (scope_id, step, key)
) WITHOUT ROWID;

CREATE TABLE tally_key (
  no INTEGER PRIMARY KEY,
  scope_id TEXT NOT NULL,
  step TEXT NOT NULL,
  lane TEXT NOT NULL,
  kind TEXT NOT NULL,
  UNIQUE (scope_id, step, lane, kind)
);
CREATE TABLE tap (
  ord INTEGER PRIMARY KEY,
  tally_no INTEGER NOT NULL,
  scope_id TEXT NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  delta INTEGER NOT NULL
);
CREATE INDEX tap_by_tally ON tap (tally_no, ord);
CREATE TABLE tap_set (
  ord INTEGER PRIMARY KEY,
  tally_no INTEGER NOT NULL,
  scope_id TEXT NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  stamp_ms INTEGER NOT NULL,
  want INTEGER NOT NULL,
  "offset" INTEGER NOT NULL,
  base_session TEXT,
  base_seq INTEGER,
  moved INTEGER NOT NULL
);
CREATE INDEX tap_set_by_tally ON tap_set (tally_no, ord);
CREATE TABLE tap_undo (
  scope_id TEXT NOT NULL,
  target_session TEXT NOT NULL,
  target_seq INTEGER NOT NULL,
  session TEXT NOT NULL,
  seq INTEGER NOT NULL,
  tally_no INTEGER NOT NULL,
  delta INTEGER NOT NULL,
  PRIMARY KEY (scope_id, target_session, target_seq)
) WITHOUT ROWID;
CREATE TABLE view_tally (
  tally_no INTEGER PRIMARY KEY,
  tap_part INTEGER NOT NULL,
  "offset" INTEGER NOT NULL,
  worked_ms INTEGER NOT NULL,
  set_session TEXT,
  set_seq INTEGER,
  set_stamp_ms INTEGER
);
`;
