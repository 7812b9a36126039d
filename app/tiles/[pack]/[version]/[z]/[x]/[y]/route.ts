import { route } from '@/lib/server/route';
import { serveTile } from '@/lib/server/tiles/serve-tile';
import { tileAddress } from '@/lib/server/tiles/tile-address';

export const GET = route(
  { can: 'agency.see', params: tileAddress },
  ({ person, params, request }) => serveTile(person, params, request),
);
