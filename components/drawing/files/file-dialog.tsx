'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import type { Fault } from '@/lib/layout/exchange';
import { parseExchange } from '@/lib/layout/exchange';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { useScreen } from '../screen-store';
import { broughtIn, MOST_FILE_BYTES, takenWords, type FileSheet } from './bring-in';

type Read =
  | { readonly state: 'none' }
  | { readonly state: 'faults'; readonly name: string; readonly faults: readonly Fault[] }
  | { readonly state: 'ready'; readonly name: string; readonly file: FileSheet };

/** Brings an exchange file into this drawing: every fault of it is told, or one entry is made. */
export function FileDialog() {
  const store = useDrawingStore();
  const sheet = useDrawing((state) => state.history.present);
  const canChangeSite = useDrawing((state) => state.canChangeSite);
  const showFile = useScreen((state) => state.showFile);
  const [read, setRead] = useState<Read>({ state: 'none' });
  const [takeGround, setTakeGround] = useState(false);

  const open = async (file: File | undefined): Promise<void> => {
    if (file) setRead(await readFile(file));
  };

  const bringIn = (name: string, file: FileSheet): void => {
    const { apply, history } = store.getState();
    const next = broughtIn(history.present, file, { takeGround: takeGround && canChangeSite });
    if (apply({ type: 'replace', sheet: next }, `Bring in ${name}`.slice(0, 200))) showFile(false);
  };

  return (
    <Dialog
      open
      onOpenChange={showFile}
      title="Bring in a layout file"
      description="A GeoJSON file as “Save as a file” writes it. It takes the place of what is drawn here, as one step that can be undone."
    >
      <label className="block font-semibold">
        File
        <input
          type="file"
          accept=".geojson,.json,application/geo+json,application/json"
          className="mt-1 block min-h-11 w-full border border-rule p-2 font-normal"
          onChange={(event) => void open(event.target.files?.[0])}
        />
      </label>
      {read.state === 'faults' && (
        <Notice kind="failed" title={`${read.name} can’t be used`} className="mt-4">
          <p>Nothing on the drawing was changed. Mend the file and choose it again.</p>
          <ul
            className="mt-2 max-h-72 overflow-y-auto"
            tabIndex={0}
            aria-label="Faults of the file"
          >
            {read.faults.map(({ path, message }, i) => (
              <li key={`${path} ${i}`} className="border-t border-rule py-1">
                <strong className="break-all">{path || 'file'}</strong>
                <span className="block">{message}</span>
              </li>
            ))}
          </ul>
        </Notice>
      )}
      {read.state === 'ready' && (
        <div className="mt-4 space-y-3">
          {canChangeSite && read.file.sheet.site.features.length > 0 && (
            <label className="flex min-h-11 items-center gap-2">
              <input
                type="checkbox"
                className="size-6 accent-[var(--action)]"
                checked={takeGround}
                onChange={(event) => setTakeGround(event.target.checked)}
              />
              Also take what the file knows of the site’s ground
            </label>
          )}
          <Words {...takenWords(sheet, read.file, { takeGround: takeGround && canChangeSite })} />
          <Button look="action" onClick={() => bringIn(read.name, read.file)}>
            Bring it in
          </Button>
        </div>
      )}
    </Dialog>
  );
}

function Words({ taken, left }: { taken: string[]; left: string[] }) {
  return (
    <dl>
      <dt className="font-bold">Taken</dt>
      {taken.map((words) => (
        <dd key={words}>{words}</dd>
      ))}
      <dt className="mt-2 font-bold">Not taken</dt>
      {left.map((words) => (
        <dd key={words}>{words}</dd>
      ))}
    </dl>
  );
}

async function readFile(file: File): Promise<Read> {
  const { name } = file;
  const refuse = (message: string): Read => ({
    state: 'faults',
    name,
    faults: [{ path: '', message }],
  });
  if (file.size > MOST_FILE_BYTES) {
    return refuse('The file is larger than 30 MB. A layout file is far smaller.');
  }
  let value: unknown;
  try {
    value = JSON.parse(await file.text());
  } catch (error) {
    return refuse(`The file is not JSON: ${error instanceof Error ? error.message : 'unreadable'}`);
  }
  const parsed = parseExchange(value);
  return parsed.ok
    ? { state: 'ready', name, file: parsed }
    : { state: 'faults', name, faults: parsed.faults };
}
