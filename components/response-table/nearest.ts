/** Index of the frequency nearest to one that is asked for, Hz. */
export function nearest(frequencyHz: readonly number[], hertz: number): number {
  let best = 0;
  frequencyHz.forEach((each, index) => {
    if (Math.abs(each - hertz) < Math.abs(frequencyHz[best]! - hertz)) best = index;
  });
  return best;
}
