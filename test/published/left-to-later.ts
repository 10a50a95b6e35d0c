/** Examples that no check answers yet, each with what it waits for or why it stays out. */
const byReason: readonly (readonly [string, readonly string[]])[] = [
  ['flexural buckling: the member check', ['CO-01', 'CO-03', 'CO-05', 'CO-09', 'CO-10', 'CO-14']],
  ['lateral torsional buckling: the member check', ['LT-01', 'LT-03', 'LT-04', 'GN-6.8-BC']],
  ['interaction of N and M: the member check', ['BC-01', 'BC-03', 'BC-04', 'GN-6.10-B']],
  ['props of EN 1065: the adjustable prop', ['PR-01', 'PR-02', 'PR-03', 'PR-04']],
  ['built-up action of two members is not taken', ['SP-05']],
  [
    'a tube with sharp corners and the mean stress across its wall; hollow sections here have the corners of EN 10210-2 or EN 10219-2, and the stress at the surface',
    ['TR-01'],
  ],
];

export const leftToLater: ReadonlyMap<string, string> = new Map(
  byReason.flatMap(([reason, ids]) => ids.map((id) => [id, reason] as const)),
);
