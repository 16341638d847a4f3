// How long a pulse stands above a part of its peak, and how much energy it has given by a time.
import type { Shot } from "./shot.ts";

/** Time at which the current passes `level` between two times, by halving; the first must be on the other side of it. */
function passage(shot: Shot, level: number, from: number, to: number): number {
  const rising = shot.at(from).current < level;
  let [low, high] = [from, to];
  for (let turn = 0; turn < 60; turn++) {
    const middle = (low + high) / 2;
    if (shot.at(middle).current < level === rising) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Width [s] of the first pulse at `part` of its peak (0.5: full width at half maximum); null when the current has not
 * fallen that far by the end of the shot. 0 < part < 1.
 */
export function widthOf(shot: Shot, part: number): number | null {
  const level = part * shot.peakCurrent;
  if (!(shot.at(shot.duration * (1 - 1e-12)).current < level)) return null;
  // walk outward from the peak, so that a later half-cycle is never taken for the falling edge
  let reach = Math.max(shot.peakTime, shot.duration * 1e-6);
  while (reach < shot.duration && shot.at(reach).current >= level) reach += Math.max(reach, shot.peakTime) / 16;
  const fall = passage(shot, level, shot.peakTime, Math.min(reach, shot.duration));
  return fall - (shot.peakTime > 0 ? passage(shot, level, 0, shot.peakTime) : 0);
}
