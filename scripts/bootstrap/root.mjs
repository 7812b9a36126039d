// @ts-check
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of this copy. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
