/** Every address of the product, in one place. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  organisation: (org: string) => `/${org}`,
  today: (org: string, plant: string) => `/${org}/plants/${plant}`,
  samples: (org: string, plant: string) => `/${org}/plants/${plant}/samples`,
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
