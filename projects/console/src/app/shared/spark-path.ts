export interface SparkPath {
  readonly line: string;
  readonly area: string;
}

const inset = 3;
const round = (value: number): number => Math.round(value * 10) / 10;

/** Path of a line from zero at the bottom to the greatest value near the top. */
export function sparkPath(
  values: readonly (number | null)[],
  width: number,
  height: number,
): SparkPath {
  const top = Math.max(0, ...values.map((value) => value ?? 0));
  const step = values.length > 1 ? width / (values.length - 1) : 0;
  const yOf = (value: number) =>
    round(height - inset - (top === 0 ? 0 : (value / top) * (height - 2 * inset)));
  let line = '';
  let area = '';
  let run: [number, number][] = [];
  const close = () => {
    const [first] = run;
    const last = run.at(-1);
    if (!first || !last) return;
    const points = run.map(([x, y]) => `${x} ${y}`).join('L');
    // A single point between gaps is drawn as a short dash.
    line += run.length === 1 ? `M${Math.max(0, first[0] - 3)} ${first[1]}h6` : `M${points}`;
    area += `M${first[0]} ${height}L${points}L${last[0]} ${height}Z`;
    run = [];
  };
  values.forEach((value, index) => {
    if (value === null) close();
    else run.push([round(index * step), yOf(value)]);
  });
  close();
  return { line, area };
}
