'use client';

import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

/**
 * A sheet laid over the sheet, for what must be settled before going on. The keyboard stays inside,
 * Escape puts it away. `description` is read out with the title.
 */
export function Dialog({
  open,
  onOpenChange,
  title,
  description,
  children,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  description?: ReactNode;
  children: ReactNode;
}) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-[2000] bg-black/50" />
        <Radix.Content
          aria-describedby={description ? undefined : ''}
          className="fixed left-1/2 top-1/2 z-[2001] max-h-[94dvh] w-[min(94vw,40rem)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto border-2 border-ink bg-paper p-6"
        >
          <div className="flex items-start justify-between gap-4">
            <Radix.Title className="text-xl font-bold">{title}</Radix.Title>
            <Radix.Close className="-mr-2 -mt-2 min-h-11 cursor-pointer px-2 underline underline-offset-4">
              Close
            </Radix.Close>
          </div>
          {description && (
            <Radix.Description asChild>
              <div className="mt-1 text-ink-soft">{description}</div>
            </Radix.Description>
          )}
          <div className="mt-4">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
