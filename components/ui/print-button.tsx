'use client';

import { Button } from './button';

export function PrintButton({ children }: { children: React.ReactNode }) {
  return (
    <Button look="action" onClick={() => window.print()}>
      {children}
    </Button>
  );
}
