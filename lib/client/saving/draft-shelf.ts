import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { Sheet } from '../../layout';

/** A drawing with changes that the server has not confirmed, as this browser keeps it. */
export type Draft = {
  readonly layoutId: string;
  readonly personId: string;
  /** When it was last written here, ISO 8601. */
  readonly at: string;
  readonly sheet: Sheet;
  /** Which part holds changes; the other is only as the server had it then. */
  readonly changed: { readonly layout: boolean; readonly site: boolean };
  /** The versions that the changes were made from. */
  readonly layoutVersion: number;
  readonly groundVersion: number;
};

export type DraftKey = Pick<Draft, 'layoutId' | 'personId'>;

export type DraftShelf = {
  read(key: DraftKey): Promise<Draft | null>;
  write(draft: Draft): Promise<void>;
  remove(key: DraftKey): Promise<void>;
};

interface Drafts extends DBSchema {
  drafts: { key: [string, string]; value: Draft };
}

const NAME = 'stillground';
const VERSION = 1;

/** Keeps drafts in this browser's IndexedDB, each person's apart: stations are shared. */
export function browserShelf(): DraftShelf {
  let opened: Promise<IDBPDatabase<Drafts>> | null = null;
  const open = (): Promise<IDBPDatabase<Drafts>> => {
    opened ??= openDB<Drafts>(NAME, VERSION, {
      upgrade: (db) => {
        db.createObjectStore('drafts', { keyPath: ['personId', 'layoutId'] });
      },
      // Another tab wants a newer version: without letting go, it would wait for ever.
      blocking: () => {
        void opened?.then((db) => db.close());
        opened = null;
      },
      terminated: () => {
        opened = null;
      },
    });
    opened.catch(() => {
      opened = null;
    });
    return opened;
  };
  const keyOf = ({ personId, layoutId }: DraftKey): [string, string] => [personId, layoutId];
  return {
    read: async (key) => (await (await open()).get('drafts', keyOf(key))) ?? null,
    write: async (draft) => {
      await (await open()).put('drafts', draft);
    },
    remove: async (key) => {
      await (await open()).delete('drafts', keyOf(key));
    },
  };
}
