/**
 * Slip of a body relative to the mean flow at one depth [m/s, downward positive], on its favourable
 * and on its unfavourable side: guided along the axis in the mean flow, or leaning, turned, or in the
 * faster flow on the axis.
 */
export interface Slip {
  readonly favourable: number;
  readonly unfavourable: number;
}
