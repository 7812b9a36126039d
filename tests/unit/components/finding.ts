import type { Finding } from '@/lib/checks';

/** A finding with everything plain, for the tests to set what they are about. */
export const finding = (members: Partial<Finding> = {}): Finding => ({
  id: `${members.rule ?? 'rods-apart'}|${(members.subjects ?? []).join()}`,
  rule: 'rods-apart',
  status: 'meets',
  gate: 'deviation',
  subjects: [],
  measured: null,
  allowed: null,
  message: 'Rods apart',
  mark: 'common-practice',
  source: 'Common practice of the trade',
  remedy: null,
  missing: [],
  ...members,
});
