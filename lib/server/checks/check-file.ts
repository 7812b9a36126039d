import { checkReport } from '@/lib/checks/report';
import { parseExchange } from '@/lib/layout/exchange';
import { refuseFaults } from '../problems/problem';

/** An exchange file's findings, exactly as the command line prints them. */
export function checkFile(file: unknown, at: string | undefined) {
  const parsed = parseExchange(file);
  if (!parsed.ok) throw refuseFaults(parsed.faults);
  const { sheet, limits } = parsed;
  return checkReport(sheet, limits, at ?? null);
}
