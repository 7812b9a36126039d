export const ROLES = ['planner', 'safety-officer', 'crew', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_WORDS: Record<Role, string> = {
  planner: 'Planner',
  'safety-officer': 'Safety officer',
  crew: 'Crew',
  administrator: 'Administrator',
};

const EVERYONE = ROLES;

/** Who may do what, once. Server handlers and screens both ask `can`; neither keeps its own list. */
const TABLE = {
  /** Sites, layouts, records and handouts of one's own agency. */
  'agency.see': EVERYONE,
  'site.change': ['planner', 'safety-officer', 'administrator'],
  'layout.draw': ['planner', 'safety-officer'],
  'layout.review': ['safety-officer'],
  'record.keep': ['planner', 'safety-officer', 'crew'],
  'limits.change': ['safety-officer', 'administrator'],
  'kit.change': ['planner', 'safety-officer', 'administrator'],
  'people.change': ['administrator'],
  'agency.change': ['administrator'],
  'audit.read': ['safety-officer', 'administrator'],
} as const satisfies Record<string, readonly Role[]>;

export type Action = keyof typeof TABLE;
export const ACTIONS = Object.keys(TABLE) as Action[];

export function can(role: Role, action: Action): boolean {
  return (TABLE[action] as readonly Role[]).includes(role);
}

export const actionsOf = (role: Role): Action[] => ACTIONS.filter((action) => can(role, action));

/** Who may do it, in words for a refusal: "a planner or a safety officer". */
export function whoMay(action: Action): string {
  const names = TABLE[action].map(
    (role) => `${role === 'administrator' ? 'an' : 'a'} ${ROLE_WORDS[role].toLowerCase()}`,
  );
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} or ${names.at(-1)}`;
}
