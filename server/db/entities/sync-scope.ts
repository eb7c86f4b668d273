import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';

import { AppUser } from './app-user';

export type ScopeKind = 'project' | 'own' | 'class';

/**
 * The unit of rights, ordering and paging: a project, a person's own things, or a class.
 * Versions are bigint and stay text in JavaScript; they are only ever compared by the database.
 */
@Entity({ name: 'sync_scope' })
@Check('sync_scope_kind_check', `kind IN ('project', 'own', 'class')`)
@Check('sync_scope_cursor_check', `0 <= min_cursor AND min_cursor <= head`)
export class SyncScope {
  @PrimaryColumn('uuid', { update: false, primaryKeyConstraintName: 'sync_scope_pkey' })
  id!: string;

  @Column({ type: 'text', update: false })
  kind!: ScopeKind;

  @Index('sync_scope_owner_id_idx')
  @Column({ type: 'uuid', name: 'owner_id', update: false })
  ownerId!: string;

  @ManyToOne(() => AppUser, { nullable: false, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'owner_id', foreignKeyConstraintName: 'sync_scope_owner_id_fkey' })
  owner!: Relation<AppUser>;

  /** the version of the last commit */
  @Column('bigint', { default: 0 })
  head!: string;

  /** raised when clients must pull everything anew */
  @Column('integer', { default: 1 })
  generation!: number;

  /** a cursor below this version must pull everything anew */
  @Column('bigint', { name: 'min_cursor', default: 0 })
  minCursor!: string;
}
