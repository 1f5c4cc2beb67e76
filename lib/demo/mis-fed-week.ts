/** One week, about five months back, in which a pump gave a fraction of what it was set to and nobody saw it. */
export const MIS_FED_WEEK = {
  worksSlug: 'quarrel-hill',
  dosingKey: 'caustic',
  firstDaysBeforeEnd: 152,
  lastDaysBeforeEnd: 146,
  shareFed: 0.12,
} as const;

export const isMisFed = (worksSlug: string, daysBeforeEnd: number): boolean =>
  worksSlug === MIS_FED_WEEK.worksSlug &&
  daysBeforeEnd <= MIS_FED_WEEK.firstDaysBeforeEnd &&
  daysBeforeEnd >= MIS_FED_WEEK.lastDaysBeforeEnd;
