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
import { SyncScope } from './sync-scope';

export const RIGHTS = ['read', 'write', 'own'] as const;
export type Right = (typeof RIGHTS)[number];

/** What one person may do in one scope; no row, no right. */
@Entity({ name: 'scope_right' })
@Check('scope_right_right_check', `"right" IN ('read', 'write', 'own')`)
export class ScopeRight {
  @PrimaryColumn('uuid', {
    name: 'scope_id',
    update: false,
    primaryKeyConstraintName: 'scope_right_pkey',
  })
  scopeId!: string;

  @Index('scope_right_user_id_idx')
  @PrimaryColumn('uuid', {
    name: 'user_id',
    update: false,
    primaryKeyConstraintName: 'scope_right_pkey',
  })
  userId!: string;

  @ManyToOne(() => SyncScope, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'scope_id', foreignKeyConstraintName: 'scope_right_scope_id_fkey' })
  scope!: Relation<SyncScope>;

  @ManyToOne(() => AppUser, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'scope_right_user_id_fkey' })
  user!: Relation<AppUser>;

  @Column('text')
  right!: Right;
}
