import { Check, Column, CreateDateColumn, Entity, Index, PrimaryColumn } from 'typeorm';

export type Role = 'member' | 'teacher' | 'admin';

/** A person with an account. The id is a UUIDv7 made by the app, never by the database. */
@Entity({ name: 'app_user' })
@Check('app_user_role_check', `role IN ('member', 'teacher', 'admin')`)
@Index('app_user_email_key', { synchronize: false }) // unique on lower(email): see the migration
export class AppUser {
  @PrimaryColumn('uuid', { update: false, primaryKeyConstraintName: 'app_user_pkey' })
  id!: string;

  @Column('text')
  email!: string;

  @Column('text', { name: 'display_name' })
  displayName!: string;

  /** given by the tables' owner; nobody promotes themselves */
  @Column({ type: 'text', update: false })
  role!: Role;

  @CreateDateColumn({ name: 'created_at', update: false, type: 'timestamptz' })
  createdAt!: Date;
}
