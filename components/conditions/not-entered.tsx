import { StatusShape } from '@/components/ui/status-mark';

/** What was not entered stands reversed, never grey: it may be what matters most. */
export function NotEntered({ children }: { children: string }) {
  return (
    <span className="inline-flex items-center gap-1.5 bg-ink px-1.5 font-bold leading-snug text-paper">
      <StatusShape status="not-known" />
      {children}
    </span>
  );
}
