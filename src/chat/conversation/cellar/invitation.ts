import type { Role } from './roster.ts';

/** An invitation as it is kept. */
export interface Invitation {
  readonly role: Role;
  /** Milliseconds since 1970. */
  readonly until: number;
  /** The person who has used it, by the platform's id, and in which chat. */
  readonly usedBy?: string;
  readonly usedIn?: string;
}
