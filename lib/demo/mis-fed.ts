/** Days on which a pump gave a share of what it was set to. */
interface MisFed {
  readonly worksSlug: string;
  readonly dosingKey: string;
  readonly firstDaysBeforeEnd: number;
  readonly lastDaysBeforeEnd: number;
  readonly shareFed: number;
}

/** One week, about five months back, in which nobody saw it. */
export const MIS_FED_WEEK = {
  worksSlug: 'quarrel-hill',
  dosingKey: 'caustic',
  firstDaysBeforeEnd: 152,
  lastDaysBeforeEnd: 146,
  shareFed: 0.12,
} as const satisfies MisFed;

/** A strainer blocking slowly: yesterday hardly to be seen, today below target and not yet put right. */
const BLOCKING_STRAINER: readonly MisFed[] = [
  { ...MIS_FED_WEEK, firstDaysBeforeEnd: 1, lastDaysBeforeEnd: 1, shareFed: 0.93 },
  { ...MIS_FED_WEEK, firstDaysBeforeEnd: 0, lastDaysBeforeEnd: 0, shareFed: 0.62 },
];

const MIS_FED: readonly MisFed[] = [MIS_FED_WEEK, ...BLOCKING_STRAINER];

/** What is wrong with a works' feeding on a day, if anything: nobody corrects the settings while it lasts. */
export const misFedOn = (worksSlug: string, daysBeforeEnd: number): MisFed | undefined =>
  MIS_FED.find(
    (fault) =>
      fault.worksSlug === worksSlug &&
      daysBeforeEnd <= fault.firstDaysBeforeEnd &&
      daysBeforeEnd >= fault.lastDaysBeforeEnd,
  );
