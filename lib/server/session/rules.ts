/** How long a session lasts: it ends when unused, and in any case after its last day. */
export const SESSION_UNUSED_HOURS = 12;
export const SESSION_DAYS = 14;

/** The address of a session's last use is written at most this often. */
export const SEEN_EVERY_SECONDS = 60;

/** Wrong passwords within the window before a wait, for one account and for one address. */
export const TRIES = { windowMinutes: 15, perAccount: 8, perAddress: 40 } as const;
