import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { NextRequest } from 'next/server';

export const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
export type Method = (typeof METHODS)[number];
type Handler = (
  request: NextRequest,
  context: { params: Promise<Record<string, string>> },
) => Promise<Response>;

export type RouteOnDisk = {
  readonly name: string;
  readonly method: Method;
  readonly handler: Handler;
};

const FOLDERS = ['app/api', 'app/tiles'];

function files(folder: string): string[] {
  try {
    return readdirSync(folder, { recursive: true, encoding: 'utf8' })
      .filter((file) => /(^|\/)route\.tsx?$/.test(file))
      .map((file) => join(folder, file));
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return [];
    throw error;
  }
}

/** Every method of every route file, named as `GET /api/sites/[siteId]`. */
export async function routesOnDisk(folders: readonly string[] = FOLDERS): Promise<RouteOnDisk[]> {
  const routes: RouteOnDisk[] = [];
  for (const file of folders.flatMap(files).sort()) {
    const exported = (await import(join(process.cwd(), file))) as Record<
      string,
      Handler | undefined
    >;
    const address = `/${file.replace(/^app\//, '').replace(/\/route\.tsx?$/, '')}`;
    for (const method of METHODS) {
      const handler = exported[method];
      if (handler) routes.push({ name: `${method} ${address}`, method, handler });
    }
  }
  return routes;
}
