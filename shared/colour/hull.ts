export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Area of the convex hull of some points, by Andrew's monotone chain; 0 for fewer than three or points in a row. */
export function hullArea(points: readonly Point[]): number {
  if (points.length < 3) return 0;
  const sorted = [...points].sort((a, b) => a.x - b.x || a.y - b.y);
  const hull = [...chain(sorted), ...chain(sorted.reverse())];
  let twice = 0;
  hull.forEach((p, i) => {
    const q = hull[(i + 1) % hull.length]!;
    twice += p.x * q.y - q.x * p.y;
  });
  return Math.abs(twice) / 2;
}

/** One side of the hull, without its last point, which begins the other side. */
function chain(sorted: readonly Point[]): Point[] {
  const side: Point[] = [];
  for (const point of sorted) {
    while (side.length >= 2 && cross(side[side.length - 2]!, side[side.length - 1]!, point) <= 0) side.pop();
    side.push(point);
  }
  return side.slice(0, -1);
}

const cross = (o: Point, a: Point, b: Point): number => (a.x - o.x) * (b.y - o.y) - (a.y - o.y) * (b.x - o.x);
