/** What somebody may do: all of it; dose, log, confirm and order; or look. */
export type Role = 'keeper' | 'hand' | 'guest';

/** The roles from the least to the most. */
export const ROLES: readonly Role[] = ['guest', 'hand', 'keeper'];

/** What a cellar is called and who may do what in it; plain JSON. */
export interface Roster {
  /** What a keeper called it. */
  readonly name?: string;
  /** What the platform called the chat from which the first invitation came. */
  readonly title?: string;
  /** By the number of the person; `none` who was removed. */
  readonly roles: Readonly<Record<string, Role | 'none'>>;
  /** The chats that joined by an invitation, and what those have in them who have no role of their own. */
  readonly chats: Readonly<Record<string, Role>>;
  /** Whose private chat is which of those, by the number of the person. */
  readonly owners: Readonly<Record<string, number>>;
  /** The number of the person who is keeper without having been made one. */
  readonly firstKeeper: number;
  /** Whether readings are answered in a group that were not said to the bot. */
  readonly readsAlong?: boolean;
}

/** Nothing was told yet: the first person is keeper. */
const FRESH_ROSTER: Roster = { roles: {}, chats: {}, owners: {}, firstKeeper: 1 };

/** The roster out of what is kept; undefined where nothing was told. */
export function readRoster(kept: string | undefined): Roster {
  return kept === undefined ? FRESH_ROSTER : { ...FRESH_ROSTER, ...(JSON.parse(kept) as Partial<Roster>) };
}

/** The higher of two roles. */
export function higherRole(one: Role | undefined, other: Role): Role {
  return one !== undefined && ROLES.indexOf(one) > ROLES.indexOf(other) ? one : other;
}
