import 'server-only';
import { createHash } from 'node:crypto';
import { openLayout, type Layout } from '@/lib/layout';

/** What of a document also stands in columns, and its fingerprint for the audit trail. */
export function columnsOf(layout: Layout) {
  return { name: layout.name?.trim() || null, pieces: layout.pieces.length, document: layout };
}

export const fingerprint = (layout: Layout): string =>
  createHash('sha256').update(JSON.stringify(layout)).digest('hex');

/** A stored document as today's code knows it. One that can't be opened is a failure of ours. */
export const openDocument = (stored: unknown): Layout => openLayout(stored);

export const layoutName = (name: string | null): string => name ?? 'Unnamed layout';
