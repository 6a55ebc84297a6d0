/** Share of one stringer in a wheel at a place, by the deck as simple beams between stringers. */
export type WheelShare = (placeFt: number) => number;

/**
 * Wheel lines on a stringer from trucks tried everywhere: a dense search that knows nothing of breakpoints.
 *
 * Trucks have wheels 6 ft apart; between neighbouring trucks stand the gaps given, ft.
 *
 * @param fromFt first place of the first wheel
 * @param toFt last place of the first wheel
 */
export function searchedWheelLines(share: WheelShare, gapsFt: readonly number[], fromFt: number, toFt: number, stepFt: number): number {
  const wheels = [0, 6];
  for (const gap of gapsFt) {
    const next = wheels[wheels.length - 1] + gap;
    wheels.push(next, next + 6);
  }
  let most = 0;
  const steps = Math.round((toFt - fromFt) / stepFt);
  for (let step = 0; step <= steps; step++) {
    const first = fromFt + step * stepFt;
    most = Math.max(
      most,
      wheels.reduce((sum, wheel) => sum + share(first + wheel), 0),
    );
  }
  return most;
}

/** Over an interior stringer at 0: 1 there, 0 at its neighbours and beyond. */
export const interiorShare =
  (S: number): WheelShare =>
  (place) =>
    Math.max(0, 1 - Math.abs(place) / S);

/** On an exterior stringer `de` inside the curb at 0: a straight line through 1 over it and 0 over the first interior stringer. */
export const exteriorShare =
  (S: number, de: number): WheelShare =>
  (place) =>
    Math.max(0, (S + de - place) / S);
