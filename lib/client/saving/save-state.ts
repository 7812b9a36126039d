export type SaveStatus =
  'saved' | 'unsaved' | 'saving' | 'offline' | 'failed' | 'stale' | 'signed-out' | 'read-only';

/** Where the drawing is kept at this moment, in words for the margin. */
export type SaveState = {
  readonly status: SaveStatus;
  /** When the server last confirmed a save, ISO 8601. */
  readonly at: string | null;
  readonly words: string;
};

const clock = (at: string): string => {
  const time = new Date(at);
  const two = (n: number): string => String(n).padStart(2, '0');
  return `${two(time.getHours())}:${two(time.getMinutes())}`;
};

/** `why` is a plain reason that the server or the browser gave, where there is one. */
export function saveWords(status: SaveStatus, at: string | null, why: string | null): string {
  switch (status) {
    case 'saved':
      return at ? `All saved ${clock(at)}` : 'All saved';
    case 'unsaved':
      return 'Not saved yet';
    case 'saving':
      return 'Saving';
    case 'offline':
      return 'No connection, kept in this browser';
    case 'failed':
      return why ? `Not saved, kept in this browser: ${why}` : 'Not saved, kept in this browser';
    case 'stale':
      return 'Someone else saved: choose which to keep';
    case 'signed-out':
      return 'Signed out, kept in this browser';
    case 'read-only':
      return 'Seen only: your role does not draw';
  }
}

export const saveState = (
  status: SaveStatus,
  at: string | null,
  why: string | null = null,
): SaveState => ({ status, at, words: saveWords(status, at, why) });
