'use client';

import type { ReactNode } from 'react';
import { SWRConfig } from 'swr';
import { unstable_serialize } from 'swr/infinite';

/**
 * What the server had already read when it made the page, so that the first picture is whole: the
 * hooks find it under the path they would ask for, show it at once and then ask all the same.
 */
export function Fetched({
  answers = {},
  firstPages = {},
  children,
}: {
  /** By path. */
  answers?: Readonly<Record<string, unknown>>;
  /** First pages of growing lists, by path. */
  firstPages?: Readonly<Record<string, unknown>>;
  children: ReactNode;
}) {
  const lists = Object.entries(firstPages).map(
    ([path, page]) => [unstable_serialize(() => path), [page]] as const,
  );
  return (
    <SWRConfig value={{ fallback: { ...answers, ...Object.fromEntries(lists) } }}>
      {children}
    </SWRConfig>
  );
}
