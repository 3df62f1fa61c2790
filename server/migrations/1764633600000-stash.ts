import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLE_OPTIONS = 'ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci';

/** The stash, in the order that the foreign keys need. A reserved sheet cannot be deleted; a deleted spread gives its sheets back. */
const TABLES: Readonly<Record<string, string>> = {
  stash_sheets: `
    id uuid NOT NULL,
    studio_id uuid NOT NULL,
    name varchar(80) NOT NULL,
    maker varchar(80) NOT NULL,
    texture varchar(80) NOT NULL,
    place varchar(80) NOT NULL,
    width int UNSIGNED NOT NULL,
    height int UNSIGNED NOT NULL,
    quantity int UNSIGNED NOT NULL,
    low_at int UNSIGNED NULL,
    price int UNSIGNED NULL,
    revision int UNSIGNED NOT NULL,
    created_at datetime(3) NOT NULL,
    updated_at datetime(3) NOT NULL,
    PRIMARY KEY (id),
    CONSTRAINT fk_stash_sheets_studio FOREIGN KEY (studio_id) REFERENCES studios(id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT ck_stash_sheets_size CHECK (width > 0 AND height > 0)`,
  stash_sides: `
    sheet_id uuid NOT NULL,
    face enum('front', 'back') NOT NULL,
    hex char(7) NOT NULL,
    source enum('picked', 'typed', 'photographed') NOT NULL,
    uncertainty double NOT NULL,
    pattern enum('plain', 'stripe', 'dot', 'check', 'print') NOT NULL,
    palette json NOT NULL,
    PRIMARY KEY (sheet_id, face),
    CONSTRAINT fk_stash_sides_sheet FOREIGN KEY (sheet_id) REFERENCES stash_sheets(id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT ck_stash_sides_uncertainty CHECK (uncertainty > 0)`,
  stash_reservations: `
    sheet_id uuid NOT NULL,
    spread_id uuid NOT NULL,
    sheets int UNSIGNED NOT NULL,
    created_at datetime(3) NOT NULL,
    PRIMARY KEY (sheet_id, spread_id),
    CONSTRAINT fk_stash_reservations_sheet FOREIGN KEY (sheet_id) REFERENCES stash_sheets(id) ON DELETE RESTRICT ON UPDATE NO ACTION,
    CONSTRAINT fk_stash_reservations_spread FOREIGN KEY (spread_id) REFERENCES spreads(id) ON DELETE CASCADE ON UPDATE NO ACTION,
    CONSTRAINT ck_stash_reservations_sheets CHECK (sheets > 0)`,
};

export class Stash1764633600000 implements MigrationInterface {
  name = 'Stash1764633600000';

  async up(runner: QueryRunner): Promise<void> {
    for (const [name, body] of Object.entries(TABLES)) await runner.query(`CREATE TABLE ${name} (${body}\n) ${TABLE_OPTIONS}`);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const name of Object.keys(TABLES).reverse()) await runner.query(`DROP TABLE ${name}`);
  }
}
