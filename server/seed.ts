import { readConfig } from './config';
import { createDataSource } from './db/data-source';
import { migrate } from './db/migrate';
import { seed } from './db/seed';

/** `node build/server/seed.js`: the schema up to date, and the demo's people in it. */
async function main(): Promise<void> {
  const config = readConfig(process.env);
  await migrate(config);
  const owner = await createDataSource(config.migrationUrl).initialize();
  try {
    await seed(owner);
  } finally {
    await owner.destroy();
  }
}

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
