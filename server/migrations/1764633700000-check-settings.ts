import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What studios and spreads say about checks: muted, and thresholds. */
export class CheckSettings1764633700000 implements MigrationInterface {
  name = 'CheckSettings1764633700000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE check_settings (
      scope_id uuid NOT NULL,
      check_id varchar(60) NOT NULL,
      studio_id uuid NOT NULL,
      spread_id uuid NULL,
      muted tinyint NULL,
      thresholds json NOT NULL,
      updated_at datetime(3) NOT NULL,
      PRIMARY KEY (scope_id, check_id),
      INDEX ix_check_settings_studio (studio_id),
      INDEX ix_check_settings_spread (spread_id),
      CONSTRAINT fk_check_settings_studio FOREIGN KEY (studio_id) REFERENCES studios(id) ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT fk_check_settings_spread FOREIGN KEY (spread_id) REFERENCES spreads(id) ON DELETE CASCADE ON UPDATE NO ACTION
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE check_settings');
  }
}
