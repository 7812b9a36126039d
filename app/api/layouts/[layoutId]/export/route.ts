import { layoutParams } from '@/lib/api';
import { exportLayout } from '@/lib/server/layouts/export-layout';
import { json, route } from '@/lib/server/route';

export const GET = route(
  { can: 'agency.see', params: layoutParams },
  async ({ person, params }) => {
    const { file, fileName } = await exportLayout(person, params.layoutId);
    return json(file, 200, {
      'content-type': 'application/geo+json',
      'content-disposition': `attachment; filename="${fileName}"`,
      'x-content-type-options': 'nosniff',
    });
  },
);
