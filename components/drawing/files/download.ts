import { keepTrying } from '../keep-trying';
import type { Limits } from '@/lib/limits';
import type { Sheet } from '@/lib/layout';

/** Hands the sheet to the reader as an exchange file, without asking the server for anything. */
export async function downloadSheet(sheet: Sheet, limits: Limits): Promise<void> {
  const { writeExchange } = await keepTrying(() => import('@/lib/layout/exchange'));
  const text = JSON.stringify(writeExchange({ sheet, limits }), null, 2);
  const address = URL.createObjectURL(new Blob([text], { type: 'application/geo+json' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = `${fileName(sheet.layout.name)}.geojson`;
  link.click();
  // The browser reads the address after the click has returned.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}

/** Letters, figures and dashes only: what every file system takes. */
const fileName = (name: string | null): string =>
  (name ?? '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 80) || 'layout';
