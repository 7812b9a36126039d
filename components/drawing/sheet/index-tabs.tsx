'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { useKeepSaved } from '../saving/keep-saved';

const TAB =
  'inline-flex min-h-11 items-center gap-1.5 whitespace-nowrap border-[1.5px] border-b-0 px-2.5 leading-none';

/** Pages of the sheet that this version lacks, with what stands in for them meanwhile. */
const NOT_YET = [
  ['Expected readings', 'Expected readings are not built yet. The checks judge places, not soil.'],
  ['Review', 'Review is not built yet. Every layout prints marked NOT APPROVED.'],
  ['Record', 'The record is not built yet. The handout has blanks to write readings in.'],
] as const;

/** The sheet's pages along its top margin. */
export function IndexTabs() {
  const store = useDrawingStore();
  const router = useRouter();
  const { saveNow } = useKeepSaved();
  const handout = `/layouts/${useDrawing((state) => state.meta.layoutId)}/handout`;
  return (
    <nav
      aria-label="Pages of this layout"
      className="flex shrink-0 items-end gap-1 max-lg:overflow-x-auto"
    >
      <span aria-current="page" className={`${TAB} border-2 border-ink bg-paper font-bold`}>
        <Number n={1} /> Drawing
      </span>
      {NOT_YET.map(([name, why], i) => (
        <button
          key={name}
          type="button"
          aria-disabled="true"
          title={why}
          onClick={() => store.getState().complain(why)}
          className={`${TAB} cursor-help border-dashed border-rule text-ink-soft`}
        >
          <Number n={i + 2} /> {name}
        </button>
      ))}
      <Link
        href={handout}
        onClick={(event) => {
          if (store.getState().save.status === 'saved' || event.ctrlKey || event.metaKey) return;
          // The handout is made by the server: it must have what is on the drawing first.
          event.preventDefault();
          void saveNow().then(() => router.push(handout));
        }}
        className={`${TAB} border-rule text-ink hover:border-ink hover:underline`}
      >
        <Number n={5} /> Handout
      </Link>
    </nav>
  );
}

const Number = ({ n }: { n: number }) => <span className="tabular-nums">{n}</span>;
