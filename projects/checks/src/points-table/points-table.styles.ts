export const pointsTableStyles = `
.ht-table sub { font-size: 0.8em; vertical-align: baseline; position: relative; top: 0.25em; }
.ht-governing > * { font-weight: 600; }
.ht-governing b { color: var(--ht-timber); margin-inline-start: 6px; font-size: 12px; }
@container ht-sheet (width < 620px) { htc-points-table .ht-table tbody th { white-space: normal; min-width: 104px; } htc-points-table .ht-table :is(th, td) { padding-inline-end: 10px; } }
`;
