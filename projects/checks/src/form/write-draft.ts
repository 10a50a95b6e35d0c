import type { AxialLoad, Load, SectionInput, WalerRequest } from '../contract';
import { writeList } from '../quantity/read-list';
import { writeQuantity } from '../quantity/read-quantity';
import { writeNumber } from '../quantity/read-number';
import { emptyRow, nextId, type LoadRow, type RestraintWord, type WalerDraft } from './draft';
import { writeGrade } from './material';

type Partly = Partial<WalerRequest>;

/** A request as the form shows it; an empty form where there is none. */
export function writeDraft(request: Partly | null, profile = ''): WalerDraft {
  const kept = request ?? {};
  const rows = [...(kept.loads ?? []).map(loadRow), ...(kept.thrust ?? []).map(thrustRow)];
  return {
    kept,
    profile: kept.profile ?? profile,
    section: writeSection(kept.section),
    count: writeCount(kept.section),
    grade: writeGrade(kept.material),
    loadBasis: kept.loadBasis ?? 'characteristic',
    spans: writeList(kept.spans ?? []),
    overhangStart: writeQuantity(kept.overhangs?.start, 1),
    overhangEnd: writeQuantity(kept.overhangs?.end, 1),
    restraint: writeRestraint(kept.restraint),
    restraintSpacing: writeSpacing(kept.restraint),
    bearingLength: writeQuantity(kept.bearing?.length, 2),
    endDistance: writeQuantity(kept.bearing?.endDistance, 2),
    loadLevel: kept.loadLevel ?? 'top',
    deflectionLimit: writeLimit(kept.deflectionLimit),
    supports: kept.supports ?? 'compression-only',
    stiffness: writeStiffness(kept.supportStiffness),
    selfWeight: kept.selfWeight ?? true,
    rows: rows.length > 0 || kept.loadSets ? rows : [emptyRow()],
    waivers: (kept.waive ?? []).map((one) => ({ id: nextId(), ...one })),
  };
}

/** A section as text: its designation, or its shape and dimensions. */
export function writeSection(section: SectionInput | undefined): string {
  if (section === undefined || typeof section === 'string') return section ?? '';
  if ('designation' in section) return section.designation;
  const { shape, ...rest } = section;
  const sizes = Object.entries(rest)
    .filter(([name]) => ['h', 'b', 'd', 'tw', 'tf', 't'].includes(name))
    .map(([, size]) => size as string | number);
  return `${shape} ${sizes.join(' × ')} mm`;
}

export function writeCount(section: SectionInput | undefined): '1' | '2' {
  return typeof section === 'object' && 'count' in section && section.count === 2 ? '2' : '1';
}

function writeRestraint(restraint: WalerRequest['restraint']): RestraintWord {
  if (restraint === undefined) return 'at-supports';
  if (typeof restraint === 'string') return restraint;
  return 'spacing' in restraint ? 'spacing' : 'kept';
}

function writeSpacing(restraint: WalerRequest['restraint']): string {
  return typeof restraint === 'object' && 'spacing' in restraint
    ? writeQuantity(restraint.spacing, 1)
    : '';
}

/** The limit, or the instant one of several. */
export function writeLimit(limit: WalerRequest['deflectionLimit']): string {
  return typeof limit === 'object' ? (limit.instant ?? '') : (limit ?? '');
}

/** Stiffnesses in a row, `rigid` for none. */
export function writeStiffness(list: WalerRequest['supportStiffness']): string {
  return (list ?? [])
    .map((one) => (one === null ? 'rigid' : typeof one === 'number' ? writeNumber(one) : one))
    .join(' + ');
}

function loadRow(load: Load): LoadRow {
  const { name, nature, category = '', kind } = load;
  const row = { ...emptyRow(), name, nature, category, shape: kind, kept: load };
  const ends = {
    from: writeQuantity('from' in load ? load.from : undefined, 1),
    to: writeQuantity('to' in load ? load.to : undefined, 1),
  };
  switch (load.kind) {
    case 'linear':
      return { ...row, ...ends, value: writeQuantity(load.start), end: writeQuantity(load.end) };
    case 'area':
      return {
        ...row,
        ...ends,
        value: writeQuantity(load.value),
        width: writeQuantity(load.width, 1),
      };
    case 'point':
    case 'moment':
      return { ...row, value: writeQuantity(load.value), at: writeQuantity(load.at, 1) };
    case 'uniform':
      return { ...row, ...ends, value: writeQuantity(load.value) };
  }
}

function thrustRow(load: AxialLoad): LoadRow {
  const { name, nature, category = '', value } = load;
  const shape = 'thrust';
  return { ...emptyRow(), name, nature, category, shape, value: writeQuantity(value), kept: load };
}
