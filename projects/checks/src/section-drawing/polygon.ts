/** A point of a cross-section in mm: y to the right, z downwards. */
export interface Place {
  readonly y: number;
  readonly z: number;
}

/** A corner of an outline: sharp, rounded to a radius, or cut as by a fillet weld of a leg. */
export interface Corner extends Place {
  readonly r?: number;
  readonly cut?: true;
}

const STEPS = 8;

/** A corner that is rounded, as short straight pieces. */
function rounded(before: Place, corner: Corner, after: Place): Place[] {
  const { y, z, r = 0, cut } = corner;
  const [back, on] = [unit(corner, before), unit(corner, after)];
  const angle = Math.acos(clamp(back.y * on.y + back.z * on.z, -1, 1));
  if (!(r > 0) || angle < 1e-6 || angle > Math.PI - 1e-6) return [{ y, z }];
  const room = Math.min(back.length, on.length);
  const tangent = Math.min(cut ? r : r / Math.tan(angle / 2), room);
  const from = { y: y + back.y * tangent, z: z + back.z * tangent };
  const to = { y: y + on.y * tangent, z: z + on.z * tangent };
  if (cut) return [from, to];
  const radius = tangent * Math.tan(angle / 2);
  const reach = radius / Math.sin(angle / 2);
  const middle = unit({ y: 0, z: 0 }, { y: back.y + on.y, z: back.z + on.z });
  const centre = { y: y + middle.y * reach, z: z + middle.z * reach };
  const start = Math.atan2(from.z - centre.z, from.y - centre.y);
  const turn = wrapped(Math.atan2(to.z - centre.z, to.y - centre.y) - start);
  return Array.from({ length: STEPS + 1 }, (_, step) => {
    const at = start + (turn * step) / STEPS;
    return { y: centre.y + radius * Math.cos(at), z: centre.z + radius * Math.sin(at) };
  });
}

function unit(from: Place, to: Place): Place & { readonly length: number } {
  const [y, z] = [to.y - from.y, to.z - from.z];
  const length = Math.hypot(y, z);
  return length === 0 ? { y: 0, z: 0, length } : { y: y / length, z: z / length, length };
}

const clamp = (value: number, least: number, most: number): number =>
  Math.max(least, Math.min(most, value));

const wrapped = (angle: number): number => angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));

/** The outline of some corners, rounded ones in short pieces. */
export function outlineOf(corners: readonly Corner[]): Place[] {
  const count = corners.length;
  return corners.flatMap((corner, index) =>
    rounded(
      corners[(index + count - 1) % count] ?? corner,
      corner,
      corners[(index + 1) % count] ?? corner,
    ),
  );
}

/** A circle about the origin. */
export function circleOf(radius: number): Place[] {
  const pieces = 72;
  return Array.from({ length: pieces }, (_, index) => {
    const at = (index * 2 * Math.PI) / pieces;
    return { y: radius * Math.cos(at), z: radius * Math.sin(at) };
  });
}

/** The centroid of what the first outline holds less what the others hold. */
export function centroidOf(outlines: readonly (readonly Place[])[]): Place {
  let [area, y, z] = [0, 0, 0];
  for (const [index, outline] of outlines.entries()) {
    const own = momentsOf(outline);
    const sign = index === 0 ? 1 : -1;
    area += sign * own.area;
    y += sign * own.y;
    z += sign * own.z;
  }
  return area === 0 ? { y: 0, z: 0 } : { y: y / area, z: z / area };
}

/** Area and first moments of an outline, whichever way it runs. */
function momentsOf(outline: readonly Place[]) {
  let [area, y, z] = [0, 0, 0];
  for (const [index, one] of outline.entries()) {
    const next = outline[(index + 1) % outline.length] ?? one;
    const cross = one.y * next.z - next.y * one.z;
    area += cross / 2;
    y += (cross * (one.y + next.y)) / 6;
    z += (cross * (one.z + next.z)) / 6;
  }
  return area < 0 ? { area: -area, y: -y, z: -z } : { area, y, z };
}
