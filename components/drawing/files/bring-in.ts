import type { Parsed } from '@/lib/layout/exchange';
import type { Sheet, SiteGround } from '@/lib/layout';

export type FileSheet = Extract<Parsed, { ok: true }>;

/** A file larger than this is no layout; reading it would only stall the page. */
export const MOST_FILE_BYTES = 30_000_000;

export type Choice = {
  /** Also the file's buried, overhead and metal lines, ground, fixed points, answers, tickets. */
  readonly takeGround: boolean;
};

/**
 * The sheet with the file's layout in place of its own. The site keeps what it knows: of the file's
 * ground only what it lacks is added. The name stays, since this is still the same layout.
 */
export function broughtIn(sheet: Sheet, file: FileSheet, { takeGround }: Choice): Sheet {
  const layout = { ...file.sheet.layout, name: sheet.layout.name ?? file.sheet.layout.name };
  return { layout, site: takeGround ? withGround(sheet.site, file.sheet.site) : sheet.site };
}

function withGround(site: SiteGround, file: SiteGround): SiteGround {
  const known = new Set(site.features.map((feature) => feature.id));
  const tickets = new Set(site.locates.map((locate) => locate.ticket));
  return {
    features: [...site.features, ...file.features.filter((feature) => !known.has(feature.id))],
    answers: { ...file.answers, ...entered(site.answers) },
    overhead_none_known_as_of: site.overhead_none_known_as_of ?? file.overhead_none_known_as_of,
    locates: [...site.locates, ...file.locates.filter((locate) => !tickets.has(locate.ticket))],
  };
}

const entered = (answers: SiteGround['answers']): SiteGround['answers'] =>
  Object.fromEntries(Object.entries(answers).filter(([, answer]) => answer != null));

const count = (n: number, one: string, many: string): string => `${n} ${n === 1 ? one : many}`;

/** What would be taken from the file, and what not, in sentences. */
export function takenWords(
  sheet: Sheet,
  file: FileSheet,
  choice: Choice,
): { taken: string[]; left: string[] } {
  const { layout, site } = file.sheet;
  const taken = [`${count(layout.pieces.length, 'piece', 'pieces')} in place of those drawn here`];
  const left = ['The limits and the acceptance value of the file: your agency’s own stay in force'];
  const known = new Set(sheet.site.features.map((feature) => feature.id));
  const fresh = site.features.filter((feature) => !known.has(feature.id)).length;
  const has = count(fresh, 'site feature', 'site features');
  if (choice.takeGround) {
    taken.push(`${has}, with answers and tickets that the site lacks`);
    const already = site.features.length - fresh;
    if (already > 0)
      left.push(`${count(already, 'feature', 'features')} that the site already has`);
  } else if (site.features.length > 0) {
    left.push(`${count(site.features.length, 'site feature', 'site features')} of the file`);
  }
  return { taken, left };
}
