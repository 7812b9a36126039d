import {
  alongTracks as by,
  dunmarrowSiding,
  TRACKS_RUN_DEG,
} from '../../tiles/scenes/dunmarrow-siding';
import { arrange } from '../arrange';

/** Nearly empty: a car and its leak, as first reported. Everything else is still to be entered. */
export const sidingFirstLook = arrange(dunmarrowSiding.origin, {
  name: 'Team track, first look',
  planned_at: '2031-05-04T11:20:00Z',
  conditions: { slope: { down_deg: 20, grade_pct: 2 } },
  liquid: null,
  kit: null,
  casualty: { at: by(60, 0), heading_deg: TRACKS_RUN_DEG, length_ft: 59.5, width_ft: 10.5 },
  leak: by(38, 5),
});
