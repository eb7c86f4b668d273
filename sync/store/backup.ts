import { z } from 'zod';

import { OperationSchema } from '../merge/operation';

/** A copy of a whole store: every operation, so that reading it in again counts each act once. */
export const BackupSchema = z.strictObject({
  kind: z.literal('backup'),
  version: z.literal(1),
  savedAtMs: z.int(),
  schema: z.int(),
  operations: z.array(OperationSchema),
});
export type Backup = z.output<typeof BackupSchema>;
