'use client';

import { AlertDialog } from 'radix-ui';
import type { ReactNode } from 'react';

/** A question that has to be answered: it can't be closed past its choices. */
export function ChoiceDialog({
  title,
  children,
  choices,
}: {
  title: string;
  children: ReactNode;
  choices: ReactNode;
}) {
  return (
    <AlertDialog.Root open>
      <AlertDialog.Portal>
        <AlertDialog.Overlay className="bg-ink/40 fixed inset-0 z-[2000]" />
        <AlertDialog.Content
          className="fixed left-1/2 top-1/2 z-[2001] max-h-[94dvh] w-[min(94vw,42rem)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto border-2 border-ink bg-paper p-6"
          onEscapeKeyDown={(event) => event.preventDefault()}
        >
          <AlertDialog.Title className="text-xl font-bold">{title}</AlertDialog.Title>
          <AlertDialog.Description asChild>
            <div className="mt-2 space-y-2">{children}</div>
          </AlertDialog.Description>
          <div className="mt-5 flex flex-wrap gap-3">{choices}</div>
        </AlertDialog.Content>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
}
