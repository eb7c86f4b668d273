import type { DataSource, EntityManager } from 'typeorm';

/**
 * Runs `work` in one transaction that names the acting person to the database, so that row-level
 * security shows and takes only that person's rows. The name ends with the transaction.
 *
 * @param userId id of the person who acts
 */
export function inTransaction<Value>(
  db: DataSource,
  userId: string,
  work: (manager: EntityManager) => Promise<Value>,
): Promise<Value> {
  return db.transaction(async (manager) => {
    // the function form of SET LOCAL, which takes no parameters
    await manager.query(`SELECT set_config('matside.user_id', $1, true)`, [userId]);
    return work(manager);
  });
}
