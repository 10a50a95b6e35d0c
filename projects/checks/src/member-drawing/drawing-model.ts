import type { Load, QuantityInput } from '../contract';
import { isEmptyRow, type LoadRow, type LoadShape, type WalerDraft } from '../form/draft';
import { shapeUnit } from '../form/read-rows';
import { writeDraft } from '../form/write-draft';
import { readList } from '../quantity/read-list';
import { readQuantity, writeQuantity } from '../quantity/read-quantity';
import { unitText, type FieldUnit } from '../quantity/units';
import { readable } from '../quantity/format';

/** A load as it is drawn; positions in m from the first support. */
export interface DrawnLoad {
  readonly shape: LoadShape;
  readonly label: string;
  readonly from: number;
  readonly to: number;
  /** Values at its two ends; the sign is the direction. */
  readonly values: readonly [number, number];
}

/** What the drawing shows; lengths in m. */
export interface DrawingModel {
  readonly spans: readonly number[];
  readonly start: number;
  readonly end: number;
  readonly loads: readonly DrawnLoad[];
  readonly thrust: readonly DrawnLoad[];
  /** Supports that lift in some combination, counted from 1. */
  readonly lifted: readonly number[];
}

/** What can be read of the form, drawn while it is typed; null without a span. */
export function drawingModel(
  draft: WalerDraft,
  lifted: readonly number[] = [],
): DrawingModel | null {
  const read = readList(draft.spans, 'm');
  const spans = read.state === 'ok' ? read.value.map(({ number }) => number) : [];
  if (spans.length === 0 || spans.some((span) => !(span > 0))) return null;
  const length = spans.reduce((sum, span) => sum + span, 0);
  const start = Math.max(0, amount(draft.overhangStart, 'm') ?? 0);
  const end = Math.max(0, amount(draft.overhangEnd, 'm') ?? 0);
  const rows = draft.kept.loadSets ? setRows(draft.kept.loadSets[0]?.loads ?? []) : draft.rows;
  const drawn = rows
    .filter((row) => !isEmptyRow(row))
    .map((row) => drawnLoad(row, -start, length + end))
    .filter((load) => load !== null);
  const thrust = drawn.filter(({ shape }) => shape === 'thrust');
  const loads = drawn.filter(({ shape }) => shape !== 'thrust');
  return { spans, start, end, loads, thrust, lifted };
}

const setRows = (loads: readonly Load[]): readonly LoadRow[] => writeDraft({ loads }).rows;

function amount(text: string, unit: FieldUnit): number | undefined {
  const reading = readQuantity(text, unit);
  return reading.state === 'ok' ? reading.value.number : undefined;
}

function drawnLoad(row: LoadRow, first: number, last: number): DrawnLoad | null {
  const { shape } = row;
  const unit = shapeUnit[shape];
  const value = amount(row.value, unit);
  const end = shape === 'linear' ? amount(row.end, unit) : value;
  if (value === undefined || end === undefined) return null;
  const label = `${row.name.trim()} ${valueText(row)}`.trim();
  const values = [value, end] as const;
  if (shape === 'thrust') return { shape, label, from: first, to: first, values };
  if (shape === 'point' || shape === 'moment') {
    const at = amount(row.at, 'm');
    return at === undefined || at < first || at > last
      ? null
      : { shape, label, from: at, to: at, values };
  }
  const from = Math.max(first, amount(row.from, 'm') ?? first);
  const to = Math.min(last, amount(row.to, 'm') ?? last);
  return to > from ? { shape, label, from, to, values } : null;
}

function valueText(row: LoadRow): string {
  const unit = shapeUnit[row.shape];
  if (row.shape === 'linear') return `${number(row.value, unit)} to ${quantity(row.end, unit)}`;
  const width = row.shape === 'area' && row.width ? ` on ${quantity(row.width, 'm')}` : '';
  return quantity(row.value, unit) + width;
}

const number = (text: string, unit: FieldUnit) => readable(amount(text, unit) ?? 0);

/** In the unit that was typed, else the field's own. */
function quantity(text: string, unit: FieldUnit): string {
  const reading = readQuantity(text, unit);
  if (reading.state !== 'ok') return text;
  const json: QuantityInput = reading.value.json;
  return typeof json === 'number' ? `${readable(json)} ${unitText(unit)}` : writeQuantity(json);
}

/** The drawing in words. */
export function drawingText({ spans, start, end, loads, thrust, lifted }: DrawingModel): string {
  const parts = [
    `Waler over ${spans.length + 1} props`,
    `${spans.length === 1 ? 'span' : 'spans'} ${spans.map((span) => readable(span)).join(', ')} m`,
  ];
  if (start > 0) parts.push(`overhang ${readable(start)} m before prop 1`);
  if (end > 0) parts.push(`overhang ${readable(end)} m beyond prop ${spans.length + 1}`);
  const length = spans.reduce((sum, span) => sum + span, 0);
  const sayLoad = ({ shape, label, from, to }: DrawnLoad) => {
    if (shape === 'thrust') return `${label} along the member`;
    if (from === to) return `${label} at ${readable(from)} m`;
    const whole = from <= -start && to >= length + end;
    return `${label} ${whole ? 'all along' : `from ${readable(from)} to ${readable(to)} m`}`;
  };
  const said = [...loads, ...thrust].map(sayLoad);
  const loaded = said.length > 0 ? `Loads: ${said.join('; ')}.` : 'No loads yet.';
  const lifting =
    lifted.length > 0 ? ` Lifts off prop ${lifted.join(', ')} in some combinations.` : '';
  return `${parts.join(', ')}. ${loaded}${lifting}`;
}
