import { z } from 'zod';
import { kitItem } from '../layout/schema';
import { id } from './common';

export const kitAnswer = z.object({ id, name: z.string(), items: z.array(kitItem) });
export const kitsAnswer = z.object({ kits: z.array(kitAnswer) });
export type KitAnswer = z.infer<typeof kitAnswer>;
export type KitsAnswer = z.infer<typeof kitsAnswer>;
