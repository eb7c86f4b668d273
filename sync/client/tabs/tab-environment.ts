import type { SqlDatabase } from '../../store/sql-database';
import type { StoreTools } from '../../store/store-tools';
import type { TabMessage } from './tab-message';

export interface OpenedDatabase {
  db: SqlDatabase;
  /** memory: the database lives in this tab, and `keep` puts copies of it elsewhere */
  storage: 'private' | 'memory';
  /** Called after every write. */
  keep(): void;
}

export interface TabChannel {
  send(message: TabMessage): void;
  close(): void;
}

/** What the browser gives a tab; tests give several tabs of one process the same. */
export interface TabEnvironment {
  build: string;
  tools: StoreTools;
  newId(): string;
  openDatabase(): Promise<OpenedDatabase>;
  openChannel(onMessage: (message: TabMessage) => void): TabChannel;
  /** Waits for the origin's one lock, never stealing it, and holds it until `hold` has ended. */
  holdLock(hold: () => Promise<void>): Promise<void>;
  /** Asks the browser to keep our data when it runs short of room. */
  askToKeep(): Promise<boolean>;
  isFull(): Promise<boolean>;
  /** Runs a job later; returns what calls it off. */
  after(delayMs: number, job: () => void): () => void;
}
