import { listKits } from '@/lib/server/kits/list-kits';
import { route } from '@/lib/server/route';

export const GET = route({ can: 'agency.see' }, ({ person }) => listKits(person));
