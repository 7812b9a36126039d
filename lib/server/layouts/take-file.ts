import type { Layout, LayoutPiece, Sheet, SiteFeature, SiteGround } from '@/lib/layout';

/** What came of taking a file's ground onto a site. */
export type Taken = {
  readonly ground: SiteGround;
  readonly changed: boolean;
  readonly notTaken: readonly string[];
};

const count = (n: number, one: string, many = `${one}s`): string => `${n} ${n === 1 ? one : many}`;

/**
 * Adds to the site what the file knows and the site doesn't. Where both speak of one thing the
 * site's word stands, and what the file said is told.
 */
export function takeGround(site: SiteGround, file: SiteGround): Taken {
  const known = new Map(site.features.map((feature) => [feature.id, feature]));
  const fresh = file.features.filter((feature) => !known.has(feature.id));
  const differing = file.features.filter((feature) => differs(known.get(feature.id), feature));
  const classes = Object.entries(file.answers).filter(([, entry]) => entry);
  const freshAnswers = classes.filter(([name]) => !site.answers[name as keyof typeof site.answers]);
  const tickets = new Set(site.locates.map((locate) => locate.ticket));
  const freshLocates = file.locates.filter((locate) => !tickets.has(locate.ticket));
  const overhead = site.overhead_none_known_as_of ?? file.overhead_none_known_as_of;

  const notTaken: string[] = [];
  if (differing.length > 0) {
    notTaken.push(
      `${count(differing.length, 'site feature')} with an id that the site already uses for something else: ${differing
        .slice(0, 5)
        .map((feature) => feature.id)
        .join(', ')}`,
    );
  }
  const keptAnswers = classes.length - freshAnswers.length;
  if (keptAnswers > 0) {
    notTaken.push(
      `${count(keptAnswers, 'owner’s answer', 'owners’ answers')}: the site has its own`,
    );
  }
  const keptLocates = file.locates.length - freshLocates.length;
  if (keptLocates > 0) {
    notTaken.push(`${count(keptLocates, 'locate ticket')} that the site already has`);
  }
  return {
    ground: {
      features: [...site.features, ...fresh],
      answers: { ...site.answers, ...Object.fromEntries(freshAnswers) },
      overhead_none_known_as_of: overhead,
      locates: [...site.locates, ...freshLocates],
    },
    changed:
      fresh.length + freshAnswers.length + freshLocates.length > 0 ||
      overhead !== site.overhead_none_known_as_of,
    notTaken,
  };
}

const differs = (known: SiteFeature | undefined, feature: SiteFeature): boolean =>
  known !== undefined && JSON.stringify(known) !== JSON.stringify(feature);

/** What a file's ground holds, in words, for when it is left out altogether. */
export function groundLeftOut(file: SiteGround): string[] {
  const answers = Object.values(file.answers).filter(Boolean).length;
  return [
    file.features.length > 0 ? count(file.features.length, 'site feature') : '',
    answers > 0 ? count(answers, 'owner’s answer', 'owners’ answers') : '',
    file.locates.length > 0 ? count(file.locates.length, 'locate ticket') : '',
    file.overhead_none_known_as_of ? 'the word that no overhead lines are known' : '',
  ].filter(Boolean);
}

/**
 * A file's ids are unique within the file, not on the site it is taken to. A piece whose id is
 * already a site feature's gets a new one, and whatever named it follows.
 */
export function withFreshIds(
  sheet: Sheet,
  taken: ReadonlySet<string>,
  newId: () => string,
): Layout {
  const renamed = new Map(
    sheet.layout.pieces.filter((piece) => taken.has(piece.id)).map((piece) => [piece.id, newId()]),
  );
  if (renamed.size === 0) return sheet.layout;
  const now = (id: string): string => renamed.get(id) ?? id;
  return {
    ...sheet.layout,
    pieces: sheet.layout.pieces.map((piece): LayoutPiece => {
      if ('from' in piece) {
        return { ...piece, id: now(piece.id), from: now(piece.from), to: now(piece.to) };
      }
      if (piece.kind === 'vent' && piece.of) {
        return { ...piece, id: now(piece.id), of: now(piece.of) };
      }
      return { ...piece, id: now(piece.id) };
    }),
  };
}
