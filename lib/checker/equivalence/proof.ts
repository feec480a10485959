/** What an agreement rests on. */
export interface Proof {
  readonly bound: number;
  readonly fields: number;
  readonly degree: number;
  readonly branches: number;
  readonly points: number;
}
