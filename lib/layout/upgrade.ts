import { LAYOUT_VERSION, layoutSchema, type Layout } from './schema';

/** A document of some version as parsed JSON. */
type Stored = Readonly<Record<string, unknown>>;

/**
 * Steps that turn a document of one version into one of the next, by the version they start from.
 * A step is never changed once documents of its version exist; a new version adds one.
 */
export const UPGRADES: Readonly<Record<number, (document: Stored) => Stored>> = {};

/**
 * Opens a stored layout document of any version that was ever saved.
 * Throws a ZodError where it isn't one, and an Error where it comes from a newer Stillground.
 */
export function openLayout(stored: unknown): Layout {
  let document = stored as Stored;
  for (let version = versionOf(document); version < LAYOUT_VERSION; version++) {
    const step = UPGRADES[version];
    if (!step) throw new Error(`There is no way from layout version ${version} to the next.`);
    document = { ...step(document), version: version + 1 };
  }
  return layoutSchema.parse(document);
}

function versionOf(document: Stored | null): number {
  const version = document?.version;
  if (typeof version !== 'number') return LAYOUT_VERSION; // no layout: the schema says so
  if (version > LAYOUT_VERSION) {
    throw new Error(`This layout was saved by a newer Stillground (version ${version}).`);
  }
  return version;
}
