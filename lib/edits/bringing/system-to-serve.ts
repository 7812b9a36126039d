import { distance } from '../../geo';
import type { LonLat } from '../../geo';
import { planeOf, probeFor, systemsInUse, type Sheet, type System } from '../../layout';
import { truePoint } from './test-line';

/**
 * The system a Y put there is for: of those that lack one, the system whose true point is nearest;
 * when none lacks one, the nearest of all. Null where no test line is drawn yet to tell by.
 */
export function systemToServe(sheet: Sheet, at: LonLat): System | null {
  const plane = planeOf(sheet.layout);
  const place = plane.toPlane(at);
  const lines = systemsInUse(sheet.layout).flatMap((system) => {
    const point = truePoint(sheet, system);
    if (!point) return [];
    const served = probeFor(sheet.layout, 'y-probe', system) !== null;
    return [{ system, served, metres: distance(place, plane.toPlane(point)) }];
  });
  const lacking = lines.filter((line) => !line.served);
  const [nearest] = (lacking.length > 0 ? lacking : lines).toSorted((a, b) => a.metres - b.metres);
  return nearest?.system ?? null;
}
