import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateScopes1796083201000 implements MigrationInterface {
  name = 'CreateScopes1796083201000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      CREATE TABLE sync_scope (
        id uuid NOT NULL,
        kind text NOT NULL,
        owner_id uuid NOT NULL,
        head bigint NOT NULL DEFAULT 0,
        generation integer NOT NULL DEFAULT 1,
        min_cursor bigint NOT NULL DEFAULT 0,
        CONSTRAINT sync_scope_pkey PRIMARY KEY (id),
        CONSTRAINT sync_scope_owner_id_fkey FOREIGN KEY (owner_id)
          REFERENCES app_user (id) ON DELETE RESTRICT,
        CONSTRAINT sync_scope_kind_check CHECK (kind IN ('project', 'own', 'class')),
        CONSTRAINT sync_scope_cursor_check CHECK (0 <= min_cursor AND min_cursor <= head)
      )`);
    await queryRunner.query('CREATE INDEX sync_scope_owner_id_idx ON sync_scope (owner_id)');
    await queryRunner.query(`
      CREATE TABLE scope_right (
        scope_id uuid NOT NULL,
        user_id uuid NOT NULL,
        "right" text NOT NULL,
        CONSTRAINT scope_right_pkey PRIMARY KEY (scope_id, user_id),
        CONSTRAINT scope_right_scope_id_fkey FOREIGN KEY (scope_id)
          REFERENCES sync_scope (id) ON DELETE CASCADE,
        CONSTRAINT scope_right_user_id_fkey FOREIGN KEY (user_id)
          REFERENCES app_user (id) ON DELETE CASCADE,
        CONSTRAINT scope_right_right_check CHECK ("right" IN ('read', 'write', 'own'))
      )`);
    await queryRunner.query('CREATE INDEX scope_right_user_id_idx ON scope_right (user_id)');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE scope_right');
    await queryRunner.query('DROP TABLE sync_scope');
  }
}
