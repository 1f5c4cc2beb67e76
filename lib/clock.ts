/** The present moment. Passed where time matters, so that tests may stand still. */
export type Clock = () => Date;

export const systemClock: Clock = () => new Date();
