/**
 * Real roots in the open interval (0, 1) of a polynomial with coefficients in ascending order,
 * ascending. Roots where it touches zero without crossing may be missing: they are no extremes of
 * its integral. A polynomial that is zero throughout has none.
 */
export function unitRoots(coefficients: readonly number[]): number[] {
  let degree = coefficients.length - 1;
  while (degree > 0 && coefficients[degree] === 0) degree--;
  const c = coefficients.slice(0, degree + 1);
  if (degree === 0) return [];
  if (degree <= 2) return quadraticRoots(c[0]!, c[1]!, c[2] ?? 0);
  const turns = unitRoots(c.slice(1).map((value, i) => value * (i + 1)));
  const roots: number[] = [];
  let low = 0;
  for (const high of [...turns, 1]) {
    const root = bracketed(c, low, high);
    if (root !== null && root > 0 && root < 1 && root !== roots[roots.length - 1]) roots.push(root);
    low = high;
  }
  return roots;
}

export function polynomial(c: readonly number[], x: number): number {
  let value = 0;
  for (let i = c.length - 1; i >= 0; i--) value = value * x + c[i]!;
  return value;
}

/** Roots in (0, 1) of c + b x + a x², without cancellation. */
function quadraticRoots(c: number, b: number, a: number): number[] {
  const discriminant = b * b - 4 * a * c;
  if (discriminant < 0) return [];
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant)) / 2;
  const roots = [q / a, c / q].filter((x) => x > 0 && x < 1);
  if (roots.length === 2 && roots[0]! > roots[1]!) roots.reverse();
  return roots[0] === roots[1] ? roots.slice(0, 1) : roots;
}

/** The root of a monotone stretch: Newton, kept inside a bracket that halves when Newton leaves it. */
function bracketed(c: readonly number[], low: number, high: number): number | null {
  const atLow = polynomial(c, low);
  const atHigh = polynomial(c, high);
  if (atLow === 0) return low;
  if (atHigh === 0) return high;
  if (atLow < 0 === atHigh < 0) return null;
  let x = (low + high) / 2;
  for (let step = 0; step < 100 && high - low > Number.EPSILON * high; step++) {
    let value = 0;
    let slope = 0;
    for (let i = c.length - 1; i >= 0; i--) {
      slope = slope * x + value;
      value = value * x + c[i]!;
    }
    if (value === 0) return x;
    if (value < 0 === atLow < 0) low = x;
    else high = x;
    const next = x - value / slope;
    if (Math.abs(next - x) <= Number.EPSILON * x) return x;
    x = next > low && next < high ? next : (low + high) / 2;
  }
  return x;
}
