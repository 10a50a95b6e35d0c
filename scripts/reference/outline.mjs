/**
 * Areas by their boundary. An outline is a set of closed loops of straight edges and quarter arcs,
 * counterclockwise where there is material, clockwise for a hole; every integral over the area is
 * taken along the edges (Green's theorem) with Gauss's points, which is exact here but for rounding.
 */

/** @typedef {'y' | 'z'} Axis */
/** @typedef {{ y: number, z: number }} Point */
/** @typedef {{ y: number, z: number, radius?: number }} Corner */
/**
 * @typedef {object} Edge
 * @property {(t: number) => Point} at for t from 0 to 1
 * @property {(t: number) => Point} slope the derivative by t
 * @property {(axis: Axis, level: number) => number[]} crossings where a coordinate takes a value
 */
/** @typedef {Edge[]} Outline */
/** @typedef {[low: number, high: number]} Interval */

/** @param {Point} from @param {Point} to @returns {Edge} */
function line(from, to) {
  const step = { y: to.y - from.y, z: to.z - from.z };
  return {
    at: (t) => ({ y: from.y + t * step.y, z: from.z + t * step.z }),
    slope: () => step,
    crossings: (axis, level) => (step[axis] === 0 ? [] : [(level - from[axis]) / step[axis]]),
  };
}

/** @param {Point} centre @param {number} radius @param {number} start @param {number} sweep @returns {Edge} */
function arc(centre, radius, start, sweep) {
  return {
    at: (t) => ({
      y: centre.y + radius * Math.cos(start + t * sweep),
      z: centre.z + radius * Math.sin(start + t * sweep),
    }),
    slope: (t) => ({
      y: -radius * sweep * Math.sin(start + t * sweep),
      z: radius * sweep * Math.cos(start + t * sweep),
    }),
    crossings: (axis, level) => {
      const ratio = (level - centre[axis]) / radius;
      if (Math.abs(ratio) >= 1) return [];
      const angle = axis === 'y' ? Math.acos(ratio) : Math.asin(ratio);
      const other = axis === 'y' ? -angle : Math.PI - angle;
      return [-1, 0, 1].flatMap((turn) =>
        [angle, other].map((each) => (each + 2 * Math.PI * turn - start) / sweep),
      );
    },
  };
}

/** @param {Point} from @param {Point} to @returns {Point} */
function direction(from, to) {
  const length = Math.hypot(to.y - from.y, to.z - from.z);
  return { y: (to.y - from.y) / length, z: (to.z - from.z) / length };
}

/**
 * A closed loop whose sides meet at right angles, each corner rounded by its radius.
 * @param {readonly Corner[]} corners @returns {Outline}
 */
export function loop(corners) {
  const turns = corners.map((corner, index) => {
    const into = direction(corners.at(index - 1) ?? corner, corner);
    const out = direction(corner, corners[(index + 1) % corners.length] ?? corner);
    const { y, z, radius = 0 } = corner;
    const begin = { y: y - radius * into.y, z: z - radius * into.z };
    const end = { y: y + radius * out.y, z: z + radius * out.z };
    const centre = { y: begin.y + radius * out.y, z: begin.z + radius * out.z };
    const isLeft = into.y * out.z - into.z * out.y > 0;
    const sweep = isLeft ? Math.PI / 2 : -Math.PI / 2;
    return { radius, begin, end, centre, start: Math.atan2(-out.z, -out.y), sweep };
  });
  return turns.flatMap(({ radius, begin, end, centre, start, sweep }, index) => {
    const side = line(end, turns[(index + 1) % turns.length]?.begin ?? begin);
    return radius > 0 ? [arc(centre, radius, start, sweep), side] : [side];
  });
}

/** @param {Interval} y @param {Interval} z @returns {Corner[]} counterclockwise */
export function rectangle([y0, y1], [z0, z1]) {
  return [
    { y: y0, z: z0 },
    { y: y1, z: z0 },
    { y: y1, z: z1 },
    { y: y0, z: z1 },
  ];
}

/** A rectangle that is taken away. @param {Interval} y @param {Interval} z @returns {Outline} */
export function hole(y, z) {
  return loop(rectangle(y, z).reverse());
}

/** Gauss's points and weights on 0 to 1. */
const GAUSS = gauss(16);

/** @param {number} count @returns {{ t: number, weight: number }[]} */
function gauss(count) {
  return Array.from({ length: count }, (_, index) => {
    let x = Math.cos((Math.PI * (index + 0.75)) / (count + 0.5));
    let slope = 1;
    for (let round = 0; round < 20; round += 1) {
      let [before, here] = [1, x];
      for (let n = 2; n <= count; n += 1) {
        [before, here] = [here, ((2 * n - 1) * x * here - (n - 1) * before) / n];
      }
      slope = (count * (x * here - before)) / (x * x - 1);
      x -= here / slope;
    }
    return { t: (1 + x) / 2, weight: 1 / ((1 - x * x) * slope * slope) };
  });
}

/**
 * The integral over the area of the derivative of `primitive`, a function of one coordinate that is
 * smooth on both sides of `level`.
 * @param {Outline} outline @param {Axis} axis @param {(x: number) => number} primitive @param {number} [level]
 */
export function integral(outline, axis, primitive, level) {
  let sum = 0;
  for (const edge of outline) {
    const cuts = level === undefined ? [] : edge.crossings(axis, level);
    const inside = cuts.filter((t) => t > 0 && t < 1).sort((one, other) => one - other);
    let from = 0;
    for (const to of [...inside, 1]) {
      for (const { t, weight } of GAUSS) {
        const at = from + t * (to - from);
        const { y, z } = edge.slope(at);
        sum += weight * (to - from) * primitive(edge.at(at)[axis]) * (axis === 'y' ? z : -y);
      }
      from = to;
    }
  }
  return sum;
}

/** @param {Outline} outline */
export function area(outline) {
  return integral(outline, 'z', (z) => z);
}

/** The coordinate of the centroid. @param {Outline} outline @param {Axis} axis */
export function centroid(outline, axis) {
  return integral(outline, axis, (x) => (x * x) / 2) / area(outline);
}

/**
 * The second moment of the distances along `axis` from the centroid.
 * @param {Outline} outline @param {Axis} axis
 */
export function secondMoment(outline, axis) {
  const middle = centroid(outline, axis);
  return integral(outline, axis, (x) => (x - middle) ** 3 / 3);
}

/**
 * The plastic modulus of the distances along `axis`, the axis of equal areas found by bisection.
 * @param {Outline} outline @param {Axis} axis @param {Interval} extent
 */
export function plasticModulus(outline, axis, extent) {
  const half = area(outline) / 2;
  let [low, high] = extent;
  for (let round = 0; round < 60; round += 1) {
    const level = (low + high) / 2;
    const beyond = integral(outline, axis, (x) => Math.max(x - level, 0), level);
    if (beyond > half) low = level;
    else high = level;
  }
  const level = (low + high) / 2;
  return integral(outline, axis, (x) => ((x - level) * Math.abs(x - level)) / 2, level);
}
