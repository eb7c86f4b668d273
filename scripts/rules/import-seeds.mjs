/** file → [code, the rule that must catch it; `null`: part of another seed] */
export const IMPORT_SEEDS = {
  'shared/seed-a.ts': ["export * from '../sync/store/migrate';", 'shared-is-pure'],
  'shared/seed-b.ts': ["export * from 'react';", 'shared-is-pure'],
  'shared/seed-c.ts': ["export * from 'node:fs';", 'shared-is-pure'],
  'sync/protocol/seed.ts': ["export * from '../store/migrate';", 'protocol-and-merge-are-pure'],
  'sync/merge/seed.ts': ["export * from 'expo-sqlite';", 'protocol-and-merge-are-pure'],
  'sync/store/seed.ts': ["export * from 'expo-sqlite';", 'store-engine-client'],
  'sync/engine/seed.ts': ["export * from '../../server/config';", 'store-engine-client'],
  'sync/client/seed.ts': [
    "export * from '@/sync/client/new-id';",
    'relative-outside-app-and-components',
  ],
  'sync/store/sqlite/seed.ts': ["export * from 'react-native';", 'expo-sqlite-in-one-place'],
  'sync/offline/seed.ts': ["export * from '../client/new-id';", 'offline-stands-alone'],
  'server/seed-a.ts': ["export * from '../sync/client/new-id';", 'server-imports'],
  'server/seed-b.ts': ["export * from '../components/ui/theme';", 'server-imports'],
  'server/seed-c.ts': ["export { In } from 'typeorm';", 'typeorm-in-db-and-repositories'],
  'components/seed-a.ts': ["export * from '@/server/config';", 'components-imports'],
  'components/seed-b.ts': ["export * from '@/sync/store/migrate';", 'components-imports'],
  'components/seed-c.ts': ["export * from '@/app/first-aid';", 'components-imports'],
  'app/seed-a.ts': ["export * from '@/sync/client/new-id';", 'app-imports-components'],
  'app/seed-b.ts': ["export * from '@/shared/model/settings';", 'app-imports-components'],
  'components/seed-d.ts': ["export * from '@/tests/support/ring-plan';", 'nothing-imports-tests'],
  'components/seed-e.ts': [
    "export { openDatabaseAsync } from 'expo-sqlite';",
    'components-imports',
  ],
  'sync/engine/seed-b.ts': ["export * from 'react';", 'store-engine-client'],
  'server/seed-h.ts': ["export * from '../sync/store/migrate';", 'server-imports'],
  'shared/seed-d.ts': ["export { z } from 'zod';", null], // allowed
  'server/seed-d.ts': ["export * from './seed-e';", 'no-cycles'],
  'server/seed-e.ts': ["export * from './seed-d';", null], // the cycle is reported once
  'server/seed-f.ts': ["export * from './nowhere';", 'resolvable'],
  'server/seed-g.ts': ["export * from 'supertest';", 'no-dev-dependencies-in-the-product'],
};
