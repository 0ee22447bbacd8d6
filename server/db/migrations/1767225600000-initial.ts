import type { MigrationInterface, QueryRunner } from 'typeorm';
import { APPLICATION_ID } from '../application-id';

const tables = [
  `CREATE TABLE person (
    id text PRIMARY KEY NOT NULL,
    email text NOT NULL UNIQUE,
    name text NOT NULL,
    site_role text NOT NULL CHECK (site_role IN ('admin', 'librarian', 'member')),
    password_hash text,
    disabled boolean NOT NULL DEFAULT (0),
    demo boolean NOT NULL DEFAULT (0),
    version integer NOT NULL DEFAULT (1),
    created_at text NOT NULL,
    updated_at text NOT NULL,
    updated_by text REFERENCES person (id) ON DELETE SET NULL
  )`,
  'CREATE INDEX person_by_name ON person (name, id)',
  'CREATE INDEX person_by_editor ON person (updated_by)',
  `CREATE TABLE session (
    id text PRIMARY KEY NOT NULL,
    person_id text NOT NULL REFERENCES person (id) ON DELETE CASCADE,
    created_at text NOT NULL,
    expires_at text NOT NULL
  )`,
  'CREATE INDEX session_by_person ON session (person_id)',
  'CREATE INDEX session_by_end ON session (expires_at)',
  `CREATE TABLE access_token (
    id text PRIMARY KEY NOT NULL,
    person_id text NOT NULL REFERENCES person (id) ON DELETE CASCADE,
    purpose text NOT NULL CHECK (purpose IN ('invitation', 'reset')),
    hash text NOT NULL UNIQUE,
    created_at text NOT NULL,
    expires_at text NOT NULL
  )`,
  'CREATE INDEX access_token_by_person ON access_token (person_id, purpose)',
  `CREATE TABLE mail (
    id text PRIMARY KEY NOT NULL,
    recipient text NOT NULL,
    subject text NOT NULL,
    text text,
    html text,
    state text NOT NULL CHECK (state IN ('kept', 'sent', 'failed')),
    error text,
    created_at text NOT NULL
  )`,
  'CREATE INDEX mail_by_time ON mail (created_at, id)',
  `CREATE TABLE board (
    id text PRIMARY KEY NOT NULL,
    name text NOT NULL,
    description text NOT NULL DEFAULT (''),
    owner_id text NOT NULL REFERENCES person (id) ON DELETE RESTRICT,
    version integer NOT NULL DEFAULT (1),
    created_at text NOT NULL,
    updated_at text NOT NULL,
    updated_by text REFERENCES person (id) ON DELETE SET NULL
  )`,
  'CREATE INDEX board_by_name ON board (name, id)',
  'CREATE INDEX board_by_owner ON board (owner_id)',
  'CREATE INDEX board_by_editor ON board (updated_by)',
  `CREATE TABLE board_member (
    board_id text NOT NULL REFERENCES board (id) ON DELETE CASCADE,
    person_id text NOT NULL REFERENCES person (id) ON DELETE CASCADE,
    role text NOT NULL CHECK (role IN ('engineer', 'reviewer', 'layout')),
    PRIMARY KEY (board_id, person_id)
  )`,
  'CREATE INDEX board_member_by_person ON board_member (person_id, role)',
  `CREATE TABLE part (
    id text PRIMARY KEY NOT NULL,
    part_number text NOT NULL,
    number_key text NOT NULL UNIQUE,
    search_text text NOT NULL,
    description text NOT NULL DEFAULT (''),
    technology text NOT NULL,
    dielectric text NOT NULL DEFAULT (''),
    case_size text NOT NULL,
    capacitance_f real NOT NULL,
    tolerance text NOT NULL,
    rated_voltage_v real NOT NULL,
    esr_ohm real NOT NULL,
    esl_h real NOT NULL,
    mount_h real NOT NULL,
    height_mm real,
    termination text NOT NULL DEFAULT ('standard'),
    unit_cost real,
    area_mm2 real,
    state text NOT NULL DEFAULT ('draft') CHECK (state IN ('draft', 'approved', 'retired')),
    version integer NOT NULL DEFAULT (1),
    created_at text NOT NULL,
    updated_at text NOT NULL,
    updated_by text REFERENCES person (id) ON DELETE SET NULL
  )`,
  'CREATE INDEX part_by_capacitance ON part (capacitance_f, id)',
  'CREATE INDEX part_by_number ON part (part_number, id)',
  'CREATE INDEX part_by_case ON part (case_size, id)',
  'CREATE INDEX part_by_dielectric ON part (dielectric, id)',
  'CREATE INDEX part_by_state ON part (state, id)',
  'CREATE INDEX part_by_editor ON part (updated_by)',
  `CREATE TABLE rail (
    id text PRIMARY KEY NOT NULL,
    board_id text NOT NULL REFERENCES board (id) ON DELETE CASCADE,
    position integer NOT NULL,
    name_key text NOT NULL,
    spec text NOT NULL,
    bank text NOT NULL,
    search text NOT NULL,
    summary text NOT NULL,
    holds boolean,
    changed boolean NOT NULL DEFAULT (1),
    version integer NOT NULL DEFAULT (1),
    created_at text NOT NULL,
    updated_at text NOT NULL,
    updated_by text REFERENCES person (id) ON DELETE SET NULL
  )`,
  'CREATE INDEX rail_by_position ON rail (board_id, position, id)',
  'CREATE UNIQUE INDEX rail_name ON rail (board_id, name_key)',
  'CREATE INDEX rail_by_editor ON rail (updated_by)',
  `CREATE TABLE rail_part (
    rail_id text NOT NULL REFERENCES rail (id) ON DELETE CASCADE,
    part_id text NOT NULL REFERENCES part (id) ON DELETE RESTRICT,
    PRIMARY KEY (rail_id, part_id)
  )`,
  'CREATE INDEX rail_part_by_part ON rail_part (part_id)',
  `CREATE TABLE revision (
    id text PRIMARY KEY NOT NULL,
    board_id text NOT NULL REFERENCES board (id) ON DELETE CASCADE,
    number integer NOT NULL,
    letter text NOT NULL,
    note text NOT NULL,
    created_at text NOT NULL,
    created_by text NOT NULL REFERENCES person (id) ON DELETE RESTRICT,
    engine_version text NOT NULL,
    hash text NOT NULL,
    rails_total integer NOT NULL,
    rails_hold integer NOT NULL,
    rails_short integer NOT NULL,
    rails_unknown integer NOT NULL,
    parts integer NOT NULL,
    cost real,
    area_mm2 real,
    snapshot text NOT NULL
  )`,
  'CREATE UNIQUE INDEX revision_number ON revision (board_id, number)',
  'CREATE INDEX revision_by_person ON revision (created_by)',
];

/** A revision may go with its whole board, never alone. */
const triggers = [
  `CREATE TRIGGER revision_never_changes BEFORE UPDATE ON revision
   BEGIN SELECT RAISE(ABORT, 'a revision never changes'); END`,
  `CREATE TRIGGER revision_stays BEFORE DELETE ON revision
   WHEN EXISTS (SELECT 1 FROM board WHERE id = OLD.board_id)
   BEGIN SELECT RAISE(ABORT, 'a revision is deleted only with its board'); END`,
];

export class Initial1767225600000 implements MigrationInterface {
  name = 'Initial1767225600000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`PRAGMA application_id = ${APPLICATION_ID}`);
    for (const statement of [...tables, ...triggers]) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    const names = ['revision', 'rail_part', 'rail', 'part', 'board_member', 'board'];
    for (const name of [...names, 'mail', 'access_token', 'session', 'person'])
      await runner.query(`DROP TABLE ${name}`);
  }
}
