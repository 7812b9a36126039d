'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => {};

/** False in the page as the server sent it, true once its controls answer. */
export const useReady = (): boolean =>
  useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
