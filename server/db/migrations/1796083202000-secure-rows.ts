import type { MigrationInterface, QueryRunner } from 'typeorm';

// The second wall behind the policy module: whatever a query asks for, the app's role gets only
// rows of the person named by `SET LOCAL matside.user_id`. No name, no rows.
const POLICIES = [
  `CREATE POLICY app_user_read ON app_user FOR SELECT USING (id = acting_user())`,
  `CREATE POLICY app_user_insert ON app_user FOR INSERT
     WITH CHECK (id = acting_user() AND role = 'member')`,
  `CREATE POLICY app_user_update ON app_user FOR UPDATE USING (id = acting_user())`,
  `CREATE POLICY app_user_delete ON app_user FOR DELETE USING (id = acting_user())`,

  `CREATE POLICY sync_scope_read ON sync_scope FOR SELECT
     USING (owner_id = acting_user() OR acting_right(id) IS NOT NULL)`,
  `CREATE POLICY sync_scope_insert ON sync_scope FOR INSERT WITH CHECK (owner_id = acting_user())`,
  `CREATE POLICY sync_scope_update ON sync_scope FOR UPDATE
     USING (owner_id = acting_user() OR acting_right(id) IN ('write', 'own'))`,
  `CREATE POLICY sync_scope_delete ON sync_scope FOR DELETE USING (acting_owns(id))`,

  `CREATE POLICY scope_right_read ON scope_right FOR SELECT
     USING (user_id = acting_user() OR acting_owns(scope_id))`,
  `CREATE POLICY scope_right_insert ON scope_right FOR INSERT WITH CHECK (acting_owns(scope_id))`,
  `CREATE POLICY scope_right_update ON scope_right FOR UPDATE USING (acting_owns(scope_id))`,
  `CREATE POLICY scope_right_delete ON scope_right FOR DELETE USING (acting_owns(scope_id))`,
];
const TABLES = ['app_user', 'sync_scope', 'scope_right'];

export class SecureRows1796083202000 implements MigrationInterface {
  name = 'SecureRows1796083202000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      CREATE FUNCTION acting_user() RETURNS uuid LANGUAGE sql STABLE
      AS $$ SELECT nullif(current_setting('matside.user_id', true), '')::uuid $$`);
    // These two run as the tables' owner: policies that read each other's tables would never end.
    const [{ schema }] = await queryRunner.query('SELECT current_schema() AS schema');
    const asOwner = `LANGUAGE sql STABLE SECURITY DEFINER SET search_path = "${schema}", pg_temp`;
    await queryRunner.query(`
      CREATE FUNCTION acting_right(scope uuid) RETURNS text ${asOwner}
      AS $$ SELECT "right" FROM scope_right WHERE scope_id = scope AND user_id = acting_user() $$`);
    await queryRunner.query(`
      CREATE FUNCTION acting_owns(scope uuid) RETURNS boolean ${asOwner}
      AS $$ SELECT EXISTS (SELECT FROM sync_scope WHERE id = scope AND owner_id = acting_user())
        OR coalesce(acting_right(scope) = 'own', false) $$`);
    for (const table of TABLES) {
      await queryRunner.query(`ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY`);
    }
    for (const policy of POLICIES) await queryRunner.query(policy);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const policy of POLICIES) {
      const [, name, table] = /^CREATE POLICY (\w+) ON (\w+)/.exec(policy) ?? [];
      await queryRunner.query(`DROP POLICY ${name} ON ${table}`);
    }
    for (const table of TABLES) {
      await queryRunner.query(`ALTER TABLE ${table} DISABLE ROW LEVEL SECURITY`);
    }
    await queryRunner.query('DROP FUNCTION acting_owns(uuid)');
    await queryRunner.query('DROP FUNCTION acting_right(uuid)');
    await queryRunner.query('DROP FUNCTION acting_user()');
  }
}
