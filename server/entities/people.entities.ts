import {
  Check,
  Column,
  Entity,
  ForeignKey,
  Index,
  PrimaryColumn,
  PrimaryGeneratedColumn,
  Unique,
} from 'typeorm';

export type OrganisationKind = 'owner' | 'applicant';
export type Role = 'applicant' | 'reviewer' | 'administrator';
export type UserStatus = 'active' | 'disabled';
export type InvitationStatus = 'asked' | 'sent' | 'accepted' | 'refused' | 'revoked';

/** The grid owner, or a company that applies to connect. */
@Entity({ name: 'organisations' })
@Check('ck_organisations_kind', `"kind" IN ('owner', 'applicant')`)
export class Organisation {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'text' }) @Index({ unique: true }) name!: string;
  @Column({ type: 'text' }) kind!: OrganisationKind;
  @Column({ type: 'boolean', default: false }) disabled!: boolean;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
}

@Entity({ name: 'users' })
@Check('ck_users_status', `"status" IN ('active', 'disabled')`)
export class User {
  @PrimaryGeneratedColumn('uuid') id!: string;
  /** As it was given; mail goes here. */
  @Column({ type: 'text' }) email!: string;
  /** Lower case and trimmed: what sign-in looks up. */
  @Column({ type: 'text' }) @Index({ unique: true }) emailKey!: string;
  @Column({ type: 'text' }) displayName!: string;
  @Column({ type: 'text', nullable: true }) passwordHash!: string | null;
  @Column({ type: 'text', default: 'active' }) status!: UserStatus;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) lastSignInAt!: Date | null;
}

@Entity({ name: 'memberships' })
@Unique(['userId', 'orgId'])
@Check('ck_memberships_role', `"role" IN ('applicant', 'reviewer', 'administrator')`)
export class Membership {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'text' }) role!: Role;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
}

/** A reviewer who may not work on an applicant's cases (employed there before, or related). */
@Entity({ name: 'reviewer_bars' })
@Unique(['userId', 'orgId'])
export class ReviewerBar {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') orgId!: string;
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
}

/** Written by the session store alone. */
@Entity({ name: 'sessions' })
export class StoredSession {
  @PrimaryColumn({ type: 'text' }) sid!: string;
  @Column({ type: 'json' }) sess!: Record<string, unknown>;
  @Column({ type: 'timestamptz', precision: 3 }) @Index() expire!: Date;
}

/** An invitation, or an account that somebody asked for and an administrator has yet to approve (no organisation yet). */
@Entity({ name: 'invitations' })
@Check('ck_invitations_status', `"status" IN ('asked', 'sent', 'accepted', 'refused', 'revoked')`)
export class Invitation {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Organisation') @Index() orgId!: string | null;
  @Column({ type: 'text' }) email!: string;
  @Column({ type: 'text' }) displayName!: string;
  @Column({ type: 'text', nullable: true }) askedOrganisation!: string | null;
  @Column({ type: 'text', nullable: true }) message!: string | null;
  @Column({ type: 'text', default: 'applicant' }) role!: Role;
  @Column({ type: 'text' }) status!: InvitationStatus;
  /** SHA-256 of the token in the link; the token itself is never stored. */
  @Column({ type: 'text', nullable: true }) @Index({ unique: true }) tokenHash!: string | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) expiresAt!: Date | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') decidedBy!: string | null;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) decidedAt!: Date | null;
}

/** A password that was forgotten; the newest one of a person counts, once. */
@Entity({ name: 'password_resets' })
export class PasswordReset {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') @Index() userId!: string;
  @Column({ type: 'text' }) @Index({ unique: true }) tokenHash!: string;
  @Column({ type: 'timestamptz', precision: 3 }) expiresAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) usedAt!: Date | null;
}

@Entity({ name: 'second_factors' })
export class SecondFactor {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  /** Encrypted with a key derived from the server's secret. */
  @Column({ type: 'text' }) sealedSecret!: string;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) confirmedAt!: Date | null;
  /** The last time step whose code was used: a code counts once. */
  @Column({ type: 'int', default: 0 }) lastStep!: number;
}

@Entity({ name: 'api_keys' })
export class ApiKey {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) @Index({ unique: true }) hash!: string;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) lastUsedAt!: Date | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) revokedAt!: Date | null;
}

/** Counters of the sign-in limits, shared by all web nodes. */
@Entity({ name: 'rate_limits' })
export class RateLimit {
  @PrimaryColumn({ type: 'varchar', length: 255 }) key!: string;
  @Column({ type: 'int', default: 0 }) points!: number;
  @Column({ type: 'bigint', nullable: true }) expire!: string | null;
}
