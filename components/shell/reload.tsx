'use client';

import { Button } from '@/components/ui/button';

export function Reload() {
  return (
    <Button look="action" onClick={() => window.location.reload()}>
      Try again
    </Button>
  );
}
