export interface Point {
  x: number;
  y: number;
}

/** Clockwise from straight up, as readings stand on a dial. */
export function polar(centre: Point, radius: number, angleDeg: number): Point {
  const angle = (angleDeg * Math.PI) / 180;
  return { x: centre.x + radius * Math.sin(angle), y: centre.y - radius * Math.cos(angle) };
}
