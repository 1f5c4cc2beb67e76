/** What is shown beside the address itself; the first page needs no number. */
function queryOf(shown: Readonly<Record<string, string | number | undefined>>): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(shown)) {
    if (value !== undefined && !(name === 'page' && value === 1)) query.set(name, String(value));
  }
  return query.size === 0 ? '' : `?${query.toString()}`;
}

/** Every address of the product, in one place. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signInRefused: '/sign-in?refused=unknown',
  signUp: '/sign-up',
  forgotten: '/forgotten-password',
  // The secret of a link stands behind the #, which a browser sends to no server and no log.
  confirmAddress: (secret = '') => `/confirm-address${secret === '' ? '' : `#${secret}`}`,
  newPassword: (secret = '') => `/new-password${secret === '' ? '' : `#${secret}`}`,
  invitation: (secret = '') => `/invitation${secret === '' ? '' : `#${secret}`}`,
  account: '/account',
  outbox: '/outbox',
  apiGuide: '/api-guide',
  openApi: '/api/v1/openapi.json',
  organisation: (org: string) => `/${org}`,
  audit: (
    org: string,
    shown: { action?: string; person?: string; from?: string; to?: string; page?: number } = {},
  ) => `/${org}/audit${queryOf(shown)}`,
  auditExport: (
    org: string,
    shown: { action?: string; person?: string; from?: string; to?: string } = {},
  ) => `/api/v1/${org}/audit.csv${queryOf(shown)}`,
  people: (org: string) => `/${org}/people`,
  tokens: (org: string) => `/${org}/tokens`,
  targets: (org: string, plant: string) => `/${org}/plants/${plant}/targets`,
  today: (org: string, plant: string) => `/${org}/plants/${plant}`,
  samples: (org: string, plant: string, shown: { point?: string; page?: number } = {}) =>
    `/${org}/plants/${plant}/samples${queryOf(shown)}`,
  newSample: (org: string, plant: string, point?: string) =>
    `/${org}/plants/${plant}/samples/new${point === undefined ? '' : `?point=${point}`}`,
  sample: (org: string, plant: string, sample: string) =>
    `/${org}/plants/${plant}/samples/${sample}`,
  plans: (org: string, plant: string) => `/${org}/plants/${plant}/plans`,
  newPlan: (org: string, plant: string, sample: string) =>
    `/${org}/plants/${plant}/plans/new?sample=${sample}`,
  plan: (org: string, plant: string, plan: string) => `/${org}/plants/${plant}/plans/${plan}`,
  trends: (org: string, plant: string, query = '') =>
    `/${org}/plants/${plant}/trends${query === '' ? '' : `?${query}`}`,
  seriesApi: (org: string, plant: string) => `/api/v1/${org}/plants/${plant}/series`,
} as const;
