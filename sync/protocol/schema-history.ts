/** One shape that a document of the wire has had. */
export interface SchemaRevision {
  /** the document's own `version`; the problem and health documents have none and stay at 1 */
  version: number;
  /** SHA-256 of its JSON schemas, as read and as written, in canonical text */
  sha256: string;
  /** what changed, in a few words */
  change: string;
}

/**
 * Every shape of every document on the wire, oldest first: the last is the one in force. Rows are
 * added and never edited. PROTOCOL.md, "How a shape changes", says when a version is due.
 */
export const SCHEMA_HISTORY = {
  planRequest: [
    {
      version: 1,
      sha256: '848fd759a20ef05a98734759dc502b2a348e0b9376de6bc130fb6603bd19b67e',
      change: 'first',
    },
  ],
  plan: [
    {
      version: 1,
      sha256: '9f95656fa5b5daca8e87359b8ce8165296719d28f38c5c52bcc53b7a1eb8e385',
      change: 'first',
    },
  ],
  problem: [
    {
      version: 1,
      sha256: '0d3519fb963c26c60d262ad3330e16209e75ed02898c5a279155531316c7a0ae',
      change: 'first',
    },
  ],
  health: [
    {
      version: 1,
      sha256: '7ae04e5858d572393d7f10fdfafda282dcdbbd893389f5fdcc1b6c579d2fe8fb',
      change: 'first',
    },
  ],
} as const satisfies Record<string, readonly SchemaRevision[]>;
