/** Where each thing is asked for; hooks and changes share them so that SWR's keys agree. */
export const PATHS = {
  sites: '/api/sites',
  site: (siteId: string) => `/api/sites/${siteId}`,
  ground: (siteId: string) => `/api/sites/${siteId}/ground`,
  layouts: (siteId: string) => `/api/sites/${siteId}/layouts`,
  layout: (layoutId: string) => `/api/layouts/${layoutId}`,
  changes: (layoutId: string) => `/api/layouts/${layoutId}/changes`,
  change: (layoutId: string, version: number) => `/api/layouts/${layoutId}/changes/${version}`,
  restore: (layoutId: string) => `/api/layouts/${layoutId}/restore`,
  /** A plain link to it downloads the exchange file. */
  exportFile: (layoutId: string) => `/api/layouts/${layoutId}/export`,
  checks: '/api/checks',
  kits: '/api/kits',
  limits: '/api/limits',
} as const;
