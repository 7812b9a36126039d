import type { BuriedLine, SiteFeature } from '../../lib/layout';
import type { Ft } from '../../tiles/scene';
import type { FromFeet } from '../feet';

/** A buried line as the demo's files of lines are written. */
export type Buried = Omit<BuriedLine, 'kind' | 'paths' | 'more' | 'label'> & {
  readonly runs: readonly (readonly Ft[])[];
};

export const buriedLines = (lines: readonly Buried[], feet: FromFeet): SiteFeature[] =>
  lines.map(({ runs, id, ...rest }) => ({
    id,
    kind: 'buried-line',
    paths: runs.map((run) => feet.path(run)),
    ...rest,
  }));
