import { PAPERS, scaleById, type LengthUnit, type PaperName, type Scale } from '@/lib/draw';

/** How to print, as the address says it: `?paper=a4&units=m&scale=1:200`. */
export type HandoutChoice = {
  readonly paper: PaperName;
  readonly units: LengthUnit;
  /** Null takes the largest that fits. */
  readonly scale: Scale | null;
};

type Asked = Readonly<Record<string, string | readonly string[] | undefined>>;

/** What can't be read is left to the default, so that an old link still prints. */
export function handoutChoice(asked: Asked): HandoutChoice {
  const said = (name: string): string | null => {
    const value = asked[name];
    return typeof value === 'string' ? value : null;
  };
  const paper = said('paper');
  const scale = scaleById(said('scale') ?? '');
  const units = said('units');
  return {
    paper: paper !== null && isPaper(paper) ? paper : 'letter',
    units: scale?.units ?? (units === 'm' ? 'm' : 'ft'),
    scale: scale?.scale ?? null,
  };
}

const isPaper = (name: string): name is PaperName => Object.hasOwn(PAPERS, name);
