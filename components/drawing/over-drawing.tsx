'use client';

import dynamic from 'next/dynamic';
import { useScreen } from './screen-store';

const KeysDialog = dynamic(() => import('./keys-dialog').then((m) => m.KeysDialog));
const FileDialog = dynamic(() => import('./files/file-dialog').then((m) => m.FileDialog));

/** Sheets laid over the drawing; their code comes when one is asked for. */
export function OverDrawing() {
  const over = useScreen((state) => state.over);
  if (over === 'keys') return <KeysDialog />;
  return over === 'file' ? <FileDialog /> : null;
}
