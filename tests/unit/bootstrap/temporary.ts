import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

/** A folder of this test's own, gone after it. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'stillground-unit-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}
