import type { Result } from 'lighthouse';

const KIB = 1024;

export type Audit = {
  readonly scores: Readonly<
    Record<'performance' | 'accessibility' | 'best-practices' | 'seo', number>
  >;
  /** Cumulative layout shift. */
  readonly shift: number;
  readonly scriptKib: number;
};

/** On a busy machine Lighthouse now and then loses a page's trace and asks to be run again. */
const TRIES = 4;

type Request = { readonly resourceType?: string; readonly transferSize?: number };

/**
 * One page by the desktop preset, in the browser that listens on `port`, keeping its sign-in.
 * Throws if the page led elsewhere: a fast sign-in page says nothing of the page behind it.
 */
export async function audit(address: string, port: number): Promise<Audit> {
  const { categories, audits, finalDisplayedUrl } = await measured(address, port);
  if (finalDisplayedUrl.replace(/\/$/, '') !== address.replace(/\/$/, '')) {
    throw new Error(`${address} led to ${finalDisplayedUrl}.`);
  }
  const score = (category: string): number => (categories[category]?.score ?? 0) * 100;
  const details = audits['network-requests']?.details;
  const requests = (details?.type === 'table' ? details.items : []) as readonly Request[];
  return {
    scores: {
      performance: score('performance'),
      accessibility: score('accessibility'),
      'best-practices': score('best-practices'),
      seo: score('seo'),
    },
    shift: audits['cumulative-layout-shift']?.numericValue ?? NaN,
    scriptKib:
      requests
        .filter(({ resourceType }) => resourceType === 'Script')
        .reduce((sum, { transferSize = 0 }) => sum + transferSize, 0) / KIB,
  };
}

async function measured(address: string, port: number): Promise<Result> {
  const { default: lighthouse, desktopConfig } = await import('lighthouse');
  const flags = { port, output: 'json', logLevel: 'error', disableStorageReset: true } as const;
  for (let tries = 1; ; tries += 1) {
    const ran = await lighthouse(address, flags, desktopConfig);
    if (ran && !ran.lhr.runtimeError) return ran.lhr;
    if (tries === TRIES) {
      throw new Error(`${address}: ${ran?.lhr.runtimeError?.message ?? 'Lighthouse gave nothing'}`);
    }
  }
}
