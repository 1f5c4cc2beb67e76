/** Every address of the product, in one place. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  organisation: (org: string) => `/${org}`,
  today: (org: string, plant: string) => `/${org}/plants/${plant}`,
  samples: (org: string, plant: string, shown: { point?: string; page?: number } = {}) => {
    const query = new URLSearchParams();
    if (shown.point !== undefined) query.set('point', shown.point);
    if (shown.page !== undefined && shown.page > 1) query.set('page', String(shown.page));
    return `/${org}/plants/${plant}/samples${query.size === 0 ? '' : `?${query.toString()}`}`;
  },
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
