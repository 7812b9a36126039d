import { health } from '@/lib/server/health/health';
import { json, openRoute } from '@/lib/server/route';

export const GET = openRoute(async () => {
  const answer = await health();
  return json(answer, answer.status === 'up' ? 200 : 503);
});
