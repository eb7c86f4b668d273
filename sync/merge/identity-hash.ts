import { nameIdentity, type Identity } from './identity';

const MASK = (1n << 64n) - 1n;

/** No edits at all: what `xorHashes` starts from. */
export const NO_EDITS = '0'.repeat(16);

/**
 * 64-bit hash of an identity, 16 hex digits. A delete names the edits it has seen by the XOR of
 * these, so they must be well mixed.
 * Source: FNV-1a (offset and prime of its authors), finished with the mixer of SplitMix64.
 */
export function hashIdentity(identity: Identity): string {
  let hash = 0xcbf29ce484222325n;
  for (const char of nameIdentity(identity)) {
    hash = ((hash ^ BigInt(char.charCodeAt(0))) * 0x100000001b3n) & MASK;
  }
  hash = ((hash ^ (hash >> 30n)) * 0xbf58476d1ce4e5b9n) & MASK;
  hash = ((hash ^ (hash >> 27n)) * 0x94d049bb133111ebn) & MASK;
  return toHex(hash ^ (hash >> 31n));
}

/** XOR of two 64-bit hashes in hex; the order in which edits are added is of no account. */
export const xorHashes = (a: string, b: string) => toHex(BigInt(`0x${a}`) ^ BigInt(`0x${b}`));

const toHex = (hash: bigint) => hash.toString(16).padStart(16, '0');
