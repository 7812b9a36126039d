import { z } from 'zod';

/** Web map clients stop at 24; a tile there is under a millimetre a pixel. */
const CLOSEST_ZOOM = 24;

/** Whole numbers as an address writes them: no sign, no leading nought, no exponent. */
const whole = z
  .string()
  .regex(/^(0|[1-9]\d{0,8})$/)
  .transform(Number);

/** `/tiles/{pack}/{version}/{z}/{x}/{y}` with a tile that the zoom has. */
export const tileAddress = z
  .object({
    pack: z.string().regex(/^[a-z0-9][a-z0-9-]{0,59}$/),
    version: z.string().regex(/^[A-Za-z0-9._-]{1,64}$/),
    z: whole,
    x: whole,
    y: whole,
  })
  .refine(({ z: zoom, x, y }) => zoom <= CLOSEST_ZOOM && x < 2 ** zoom && y < 2 ** zoom);

export type TileAddress = z.output<typeof tileAddress>;
