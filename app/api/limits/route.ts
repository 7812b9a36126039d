import { readLimits } from '@/lib/server/limits/read-limits';
import { route } from '@/lib/server/route';

export const GET = route({ can: 'agency.see' }, ({ person }) => readLimits(person));
