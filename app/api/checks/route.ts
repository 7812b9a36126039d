import { z } from 'zod';
import { checksQuery, MOST_BYTES } from '@/lib/api';
import { checkFile } from '@/lib/server/checks/check-file';
import { route } from '@/lib/server/route';

export const POST = route(
  { can: 'agency.see', query: checksQuery, body: z.unknown(), mostBytes: MOST_BYTES.ground },
  async ({ query, body }) => checkFile(body, query.at),
);
