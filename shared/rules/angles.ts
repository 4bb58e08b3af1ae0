/**
 * Degrees as radians.
 *
 * @param deg - any angle, degrees.
 * @returns the angle, radians.
 * @source derived-geometry
 * @example toRadians(180) // 3.14159
 */
export function toRadians(deg: number): number {
  return (deg * Math.PI) / 180;
}

/**
 * Radians as degrees.
 *
 * @param rad - any angle, radians.
 * @returns the angle, degrees.
 * @source derived-geometry
 * @example toDegrees(Math.PI / 2) // 90
 */
export function toDegrees(rad: number): number {
  return (rad * 180) / Math.PI;
}
