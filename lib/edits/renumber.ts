import { rodsOf, SYSTEMS, type Piece, type Sheet } from '../layout';
import { withPieces } from './sheet-pieces';

/** Labels the rods of each system C1, C2 … in the order drawn. Ids, and so joins, stay. */
export function renumber(sheet: Sheet): Sheet {
  const changed = new Map<string, Piece>();
  for (const system of SYSTEMS) {
    rodsOf(sheet.layout, system).forEach((rod, i) => {
      const label = `${system}${i + 1}`;
      if (rod.label !== label) changed.set(rod.id, { ...rod, label });
    });
  }
  return changed.size === 0 ? sheet : withPieces(sheet, changed);
}
