'use client';

import dynamic from 'next/dynamic';
import { keepTrying } from './keep-trying';
import { useScreen } from './screen-store';

const KeysDialog = dynamic(() =>
  keepTrying(() => import('./keys-dialog').then((m) => m.KeysDialog)),
);
const FileDialog = dynamic(() =>
  keepTrying(() => import('./files/file-dialog').then((m) => m.FileDialog)),
);

/** Sheets laid over the drawing; their code comes when one is asked for. */
export function OverDrawing() {
  const over = useScreen((state) => state.over);
  if (over === 'keys') return <KeysDialog />;
  return over === 'file' ? <FileDialog /> : null;
}
