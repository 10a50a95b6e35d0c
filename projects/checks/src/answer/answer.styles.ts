export const answerStyles = `
.ht-answer { display: grid; gap: 16px; align-content: start; font-size: 13px; }
.ht-status { display: flex; align-items: center; gap: 10px; font: 600 17px/1.3 var(--ht-sans); min-height: 26px; }
.ht-status-pass { color: var(--ht-pass); }
.ht-status-fail { color: var(--ht-fail); }
.ht-status-incomplete, .ht-status-provisional, .ht-status-away { color: var(--ht-warn); }
.ht-term { display: inline-block; margin-inline-end: 0.5em; }
.ht-answer b { font-weight: 600; }
.ht-util { display: grid; grid-template-columns: auto 1fr; gap: 14px; align-items: center; }
.ht-util strong { font: 600 34px/1 var(--ht-mono); letter-spacing: -0.03em; font-variant-numeric: tabular-nums; }
.ht-util-fail strong { color: var(--ht-fail); }
.ht-ver > li { display: grid; grid-template-columns: minmax(0, 1fr) auto 76px; gap: 10px; align-items: center; padding: 8px 0; border-top: 1px solid var(--ht-rule); font-size: 14px; line-height: 1.35; }
.ht-ver > li:last-child { border-bottom: 1px solid var(--ht-rule); }
.ht-ver small { display: block; color: var(--ht-quiet); font: 11px/1.45 var(--ht-mono); margin-top: 2px; overflow-wrap: anywhere; }
.ht-ver small.ht-words { font-family: var(--ht-sans); font-size: 12px; }
.ht-ver .ht-n { font-size: 13px; }
.ht-ver-fails .ht-n { color: var(--ht-fail); font-weight: 600; }
.ht-ver .ht-ver-not { grid-template-columns: minmax(0, 1fr) auto; color: var(--ht-warn); }
.ht-ver > li.ht-ver-not { grid-template-columns: minmax(0, 1fr) auto; }
.ht-ver-not > span:first-child { color: var(--ht-warn); }
.ht-ver-waived > span:first-child { color: var(--ht-ink); }
.ht-ver-word { font-size: 12px; color: var(--ht-quiet); }
.ht-ver-not .ht-ver-word { color: var(--ht-warn); }
.ht-notes { display: grid; gap: 10px; }
.ht-notes li { display: grid; gap: 0; }
.ht-notes small { font: 11px/1.5 var(--ht-mono); color: var(--ht-quiet); }
.ht-notes b { color: var(--ht-warn); }
.ht-notes .ht-note-info { color: var(--ht-quiet); }
.ht-wrongs { display: grid; gap: 8px; }
.ht-wrongs li { border-inline-start: 2px solid var(--ht-fail); padding-inline-start: 10px; overflow-wrap: anywhere; }
.ht-wrongs code { font: 12px var(--ht-mono); color: var(--ht-quiet); display: block; }
.ht-acts { display: flex; flex-wrap: wrap; gap: 8px; }
@media print { .ht-status { print-color-adjust: exact; } }
`;
