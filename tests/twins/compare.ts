import type { Finding, MeasureUnit, WindArc } from '@/lib/checks';
import { turnBetween } from './ground';
import type { TwinFinding } from './scene';

/** How far two honest measurements of one thing may lie apart. */
const WITHIN: Record<MeasureUnit, number> = {
  ft: 0.01,
  deg: 0.01,
  ratio: 0.001,
  count: 0,
  min: 1e-6,
  ohm: 0,
};

/** Every disagreement between the checks' answers and the twins', in words; none is agreement. */
export function compareFindings(ours: readonly Finding[], twins: readonly TwinFinding[]): string[] {
  const faults: string[] = [];
  const found = new Map(ours.map((finding) => [finding.id, finding]));
  const expected = new Map(twins.map((twin) => [twin.id, twin]));
  if (found.size !== ours.length) faults.push('an id is answered twice');
  for (const { id } of ours) if (!expected.has(id)) faults.push(`${id}: not expected`);
  for (const twin of twins) {
    const finding = found.get(twin.id);
    if (!finding) {
      if (!twin.maybe) faults.push(`${twin.id}: missing, ${twin.status} expected`);
      continue;
    }
    faults.push(...disagreements(finding, twin).map((fault) => `${twin.id}: ${fault}`));
  }
  return faults;
}

function disagreements({ status, gate, measured }: Finding, twin: TwinFinding): string[] {
  const faults: string[] = [];
  if (!twin.tie && status !== twin.status)
    faults.push(`${status}, ${twin.status} expected (${measured?.value}, ${twin.value})`);
  if (!twin.tie && gate !== twin.gate) faults.push(`gate ${gate}, ${twin.gate} expected`);
  if (!measured !== (twin.value === null))
    faults.push(`${status} measured ${measured?.value}, ${twin.value} expected`);
  if (measured && twin.value !== null && twin.unit) {
    const { value, unit } = measured;
    if (unit !== twin.unit) faults.push(`unit ${unit}, ${twin.unit} expected`);
    // A ratio of many times carries its lengths' millimetres many times over.
    const within = WITHIN[twin.unit] * (unit === 'ratio' ? Math.max(1, twin.value) : 1);
    if (!twin.tie && !(Math.abs(value - twin.value) <= within))
      faults.push(`measured ${value}, ${twin.value} expected`);
  }
  return faults;
}

/** The twin's arc is a string of tried winds, so its ends may be one step short. */
export function compareArcs(ours: WindArc | null, twin: WindArc | null): string[] {
  if (!ours || !twin) {
    const narrow = ours && turnBetween(ours.from_deg, ours.to_deg) < 0.02;
    return !ours === !twin || narrow ? [] : [`stands for ${JSON.stringify({ ours, twin })}`];
  }
  const off = [turnBetween(ours.from_deg, twin.from_deg), turnBetween(ours.to_deg, twin.to_deg)];
  return Math.max(...off) <= 0.02 ? [] : [`stands for ${JSON.stringify({ ours, twin })}`];
}
