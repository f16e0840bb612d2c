export type PlaneSort = 'pitched' | 'flat' | 'wall' | 'ground';

const POINTS = ['North', 'North-east', 'East', 'South-east', 'South', 'South-west', 'West', 'North-west'];

/** A name for a plane by its sort and the azimuth it faces [degrees]; numbered where it is taken. */
export function planeName(sort: PlaneSort, surfaceAzimuth: number, taken: readonly string[]): string {
  const point = POINTS[Math.round((((surfaceAzimuth % 360) + 360) % 360) / 45) % 8];
  const stem = {
    pitched: `${point} roof`,
    flat: 'Flat roof',
    wall: `${point} wall`,
    ground: 'Ground mount',
  }[sort];
  for (let count = 1; ; count++) {
    const name = count === 1 ? stem : `${stem} ${count}`;
    if (!taken.includes(name)) return name;
  }
}
