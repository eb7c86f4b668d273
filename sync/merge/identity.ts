import { z } from 'zod';

/** 128 random bits, minted at the first write after a store was opened: 32 hex digits. */
export const SessionSchema = z.string().regex(/^[0-9a-f]{32}$/);

/** The name of an act inside its scope: (session, seq), seq 1, 2, 3 …; an identity counts once. */
export const IdentitySchema = z.strictObject({ session: SessionSchema, seq: z.int().min(1) });
export type Identity = z.output<typeof IdentitySchema>;

/** An identity and the instant its act was accepted with, in milliseconds of the hybrid clock. */
export interface Stamped extends Identity {
  stampMs: number;
}

export const nameIdentity = ({ session, seq }: Identity) => `${session}:${seq}`;

/** Positive when `a` is the larger (stamp, session, seq): the same order on every device. */
export function compareStamped(a: Stamped, b: Stamped): number {
  if (a.stampMs !== b.stampMs) return a.stampMs - b.stampMs;
  if (a.session !== b.session) return a.session < b.session ? -1 : 1;
  return a.seq - b.seq;
}
