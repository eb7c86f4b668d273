import type { MigrationInterface, QueryRunner } from 'typeorm';

export class CreateUsers1796083200000 implements MigrationInterface {
  name = 'CreateUsers1796083200000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      CREATE TABLE app_user (
        id uuid NOT NULL,
        email text NOT NULL,
        display_name text NOT NULL,
        role text NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now(),
        CONSTRAINT app_user_pkey PRIMARY KEY (id),
        CONSTRAINT app_user_role_check CHECK (role IN ('member', 'teacher', 'admin'))
      )`);
    await queryRunner.query('CREATE UNIQUE INDEX app_user_email_key ON app_user (lower(email))');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE app_user');
  }
}
