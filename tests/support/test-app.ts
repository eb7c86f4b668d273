import type { Express } from 'express';
import type { DataSource } from 'typeorm';

import { createApp, type AppOptions } from '../../server/app';

/** The real app over a database, with limits out of the way and a silent log unless asked for. */
export function createTestApp(db: DataSource, options: Partial<AppOptions> = {}): Express {
  return createApp({
    db,
    logLevel: 'silent',
    apiPerMinute: 100_000,
    plansPerMinute: 100_000,
    trustProxyHops: 0,
    ...options,
  });
}
