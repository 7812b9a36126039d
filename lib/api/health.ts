import { z } from 'zod';

export const healthAnswer = z.object({ status: z.enum(['up', 'database-away']) });
export type HealthAnswer = z.infer<typeof healthAnswer>;
