import 'server-only';
import { writeExchange } from '@/lib/layout/exchange';
import type { SignedIn } from '../session';
import { readLayout } from './read-layout';

/** The layout with its site's ground and the agency's limits as one exchange file. */
export async function exportLayout(
  person: SignedIn,
  layoutId: string,
): Promise<{ file: object; fileName: string }> {
  const { layout, site, limits } = await readLayout(person, layoutId);
  return {
    file: writeExchange({ sheet: { layout, site: site.ground }, limits }),
    fileName: `${plainName(`${site.name} ${layout.name ?? ''}`)}.geojson`,
  };
}

/** Letters, digits and dashes of any name, so that no system and no header trips over it. */
const plainName = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 80) || 'layout';
