export interface Organisation {
  readonly id: string;
  readonly slug: string;
  readonly name: string;
  /** Invented data for trying Marlwick out; every screen says so. */
  readonly isDemo: boolean;
}
