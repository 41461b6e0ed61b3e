/** How far a number may be from the recorded one, relative to the larger of both or to what a difference was taken of. */
export const TOLERANCE = 1e-9;

/** Whether two numbers are the same but for the rounding of another machine. */
export function agree(one: number, other: number, scale = 0): boolean {
  return Math.abs(one - other) <= TOLERANCE * Math.max(Math.abs(one), Math.abs(other), scale);
}
