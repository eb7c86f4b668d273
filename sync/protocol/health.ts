import { z } from 'zod';

/** What `GET /api/health` answers while the server and its database are well. */
export const HealthSchema = z.object({ status: z.literal('ok'), version: z.string() });
export type Health = z.output<typeof HealthSchema>;
