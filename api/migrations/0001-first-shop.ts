/** The first tables. A migration that has shipped is never edited: the next change is the next migration. */
export const firstShop = {
  name: '0001-first-shop',
  statements: [
    `CREATE TABLE shop (
       id INTEGER PRIMARY KEY CHECK (id = 1),
       name TEXT NOT NULL,
       kind TEXT NOT NULL CHECK (kind IN ('demo', 'own')),
       created_at TEXT NOT NULL,
       filled_at TEXT
     )`,
    `CREATE TABLE people (
       id TEXT PRIMARY KEY,
       email TEXT NOT NULL UNIQUE,
       name TEXT NOT NULL,
       password_hash TEXT NOT NULL,
       roles TEXT NOT NULL,
       active INTEGER NOT NULL DEFAULT 1,
       created_at TEXT NOT NULL
     )`,
    `CREATE TABLE parts (
       id TEXT PRIMARY KEY,
       number TEXT NOT NULL,
       number_key TEXT NOT NULL,
       title TEXT NOT NULL,
       title_key TEXT NOT NULL,
       search_text TEXT NOT NULL,
       created_at TEXT NOT NULL,
       created_by TEXT NOT NULL REFERENCES people (id),
       changed_at TEXT NOT NULL,
       changed_by TEXT NOT NULL REFERENCES people (id),
       revision TEXT NOT NULL,
       state TEXT NOT NULL,
       unit TEXT NOT NULL,
       thickness REAL,
       material TEXT,
       blank_length REAL,
       blank_width REAL,
       bends INTEGER NOT NULL,
       stops INTEGER NOT NULL
     )`,
    // A number belongs to one part, whatever its case: hc-2101-1 on the shop floor is HC-2101-1.
    'CREATE UNIQUE INDEX parts_number ON parts (number COLLATE NOCASE)',
    // The text of the search lies in the indexes that sort: a rare word is found without opening every part.
    'CREATE INDEX parts_number_key ON parts (number_key, id, search_text)',
    'CREATE INDEX parts_title_key ON parts (title_key, id, search_text)',
    'CREATE INDEX parts_changed ON parts (changed_at, id, search_text)',
    'CREATE INDEX parts_material ON parts (material, unit)',
    'CREATE INDEX parts_unit ON parts (unit)',
    `CREATE TABLE revisions (
       id TEXT PRIMARY KEY,
       part_id TEXT NOT NULL REFERENCES parts (id),
       letter TEXT NOT NULL,
       state TEXT NOT NULL,
       version INTEGER NOT NULL,
       document TEXT NOT NULL,
       result TEXT NOT NULL,
       outline TEXT,
       engine_version TEXT NOT NULL,
       created_at TEXT NOT NULL,
       created_by TEXT NOT NULL REFERENCES people (id),
       changed_at TEXT NOT NULL,
       changed_by TEXT NOT NULL REFERENCES people (id),
       UNIQUE (part_id, letter)
     )`,
    `CREATE TABLE revision_editors (
       revision_id TEXT NOT NULL REFERENCES revisions (id),
       person_id TEXT NOT NULL REFERENCES people (id),
       first_edit_at TEXT NOT NULL,
       last_edit_at TEXT NOT NULL,
       PRIMARY KEY (revision_id, person_id)
     )`,
    'CREATE TABLE sessions (sid TEXT PRIMARY KEY, expires TEXT NOT NULL, data TEXT NOT NULL)',
    'CREATE INDEX sessions_expires ON sessions (expires)',
  ],
};
