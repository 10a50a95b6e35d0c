import type { QuantityInput, SectionInput, WalerRequest } from '../contract';
import type { WalerDraft } from './draft';
import { FieldReader, type DraftReading } from './field-reader';
import { readMaterial } from './material';
import { readRows } from './read-rows';
import { writeCount, writeDraft, writeLimit, writeSection, writeStiffness } from './write-draft';

/** Reads the form; what it does not show is taken from the request it was filled from. */
export function readDraft(draft: WalerDraft): DraftReading<WalerRequest> {
  const reader = new FieldReader();
  const shown = writeDraft(draft.kept);
  const same = (...names: (keyof WalerDraft)[]) => names.every((n) => draft[n] === shown[n]);
  const { kept } = draft;
  const spans = same('spans') ? kept.spans : reader.list('/spans', draft.spans, 'm');
  const { loads, thrust } = readRows(draft.rows, reader);
  const section = readSection(draft);
  const material = readMaterial(kept.material, draft.grade);
  const made = {
    ...kept,
    profile: draft.profile || undefined,
    section,
    material,
    loadBasis: draft.loadBasis,
    spans,
    overhangs: readOverhangs(draft, reader),
    loads: kept.loadSets ? undefined : loads,
    thrust: thrust.length > 0 ? thrust : undefined,
    restraint: readRestraint(draft, reader),
    bearing: readBearing(draft, reader),
    loadLevel: same('loadLevel') ? kept.loadLevel : draft.loadLevel,
    deflectionLimit: readLimit(draft, reader),
    supports: same('supports') ? kept.supports : draft.supports,
    supportStiffness: readStiffness(draft, spans?.length ?? 0, reader),
    selfWeight: same('selfWeight') ? kept.selfWeight : draft.selfWeight,
    waive: readWaivers(draft, reader),
  };
  const wanting = [
    ...(section ? [] : ['a section']),
    ...(material ? [] : ['a steel grade']),
    ...(draft.spans.trim() === '' ? ['spans'] : []),
    ...(kept.loadSets || loads.length > 0 ? [] : ['a load']),
  ];
  return reader.reading(made, wanting);
}

function readSection({ kept, section, count }: WalerDraft): SectionInput | undefined {
  const text = section.trim();
  if (text === '') return undefined;
  const sameText = text === writeSection(kept.section);
  if (kept.section && sameText && count === writeCount(kept.section)) return kept.section;
  const base = typeof kept.section === 'object' ? kept.section : {};
  if (sameText && !('designation' in base) && 'shape' in base) {
    return { ...base, count: Number(count) } as SectionInput;
  }
  // Overrides belong to the section they were given for.
  const { connected } = base as { connected?: boolean };
  if (count === '1') return text;
  return { designation: text, count: 2, ...(connected !== undefined && { connected }) };
}

function readOverhangs(draft: WalerDraft, reader: FieldReader): WalerRequest['overhangs'] {
  const shown = writeDraft(draft.kept);
  if (draft.overhangStart === shown.overhangStart && draft.overhangEnd === shown.overhangEnd) {
    return draft.kept.overhangs;
  }
  const start = reader.quantity('/overhangs/start', draft.overhangStart, 'm');
  const end = reader.quantity('/overhangs/end', draft.overhangEnd, 'm');
  if (start === undefined && end === undefined) return undefined;
  return { ...(start !== undefined && { start }), ...(end !== undefined && { end }) };
}

function readRestraint(draft: WalerDraft, reader: FieldReader): WalerRequest['restraint'] {
  const shown = writeDraft(draft.kept);
  const { restraint, restraintSpacing } = draft;
  if (restraint === shown.restraint && restraintSpacing === shown.restraintSpacing) {
    return draft.kept.restraint ?? (draft.kept.spans ? undefined : 'at-supports');
  }
  if (restraint === 'kept') return draft.kept.restraint;
  if (restraint !== 'spacing') return restraint;
  const spacing = reader.needed('/restraint/spacing', restraintSpacing, 'm');
  return spacing === undefined ? undefined : { spacing };
}

function readBearing(draft: WalerDraft, reader: FieldReader): WalerRequest['bearing'] {
  const shown = writeDraft(draft.kept);
  if (draft.bearingLength === shown.bearingLength && draft.endDistance === shown.endDistance) {
    return draft.kept.bearing;
  }
  const length = reader.quantity('/bearing/length', draft.bearingLength, 'm');
  const endDistance = reader.quantity('/bearing/endDistance', draft.endDistance, 'm');
  if (length === undefined) {
    if (endDistance !== undefined)
      reader.fault('/bearing/length', 'Give the length of the bearing.');
    return undefined;
  }
  return { ...draft.kept.bearing, length, ...(endDistance !== undefined && { endDistance }) };
}

function readLimit(draft: WalerDraft, reader: FieldReader): WalerRequest['deflectionLimit'] {
  const { kept, deflectionLimit } = draft;
  const text = deflectionLimit.trim();
  if (text === writeLimit(kept.deflectionLimit)) return kept.deflectionLimit;
  const others = typeof kept.deflectionLimit === 'object' ? kept.deflectionLimit : undefined;
  if (text === '') {
    const rest = Object.entries(others ?? {}).filter(([name]) => name !== 'instant');
    return rest.length > 0 ? Object.fromEntries(rest) : undefined;
  }
  const ratio = /^(?:(?:span|l|1)\s*\/\s*)?(\d{1,5}(?:\.\d{1,3})?)$/i.exec(text);
  if (!ratio) {
    reader.fault('/deflectionLimit', 'Give a part of the span, such as span/200.');
    return undefined;
  }
  const instant = `span/${ratio[1]}`;
  return others ? { ...others, instant } : instant;
}

function readStiffness(draft: WalerDraft, spans: number, reader: FieldReader) {
  const { kept, stiffness } = draft;
  const text = stiffness.trim();
  if (text === writeStiffness(kept.supportStiffness)) return kept.supportStiffness;
  if (text === '') return undefined;
  const pointer = '/supportStiffness';
  const parts = text.split(/\s*(?:\+|;|,\s+)\s*/);
  const list = parts.map((part) =>
    /^(rigid|null|-|–|∞)$/i.test(part) ? null : reader.needed(pointer, part, 'kN/mm'),
  );
  if (spans > 0 && list.length !== spans + 1) {
    reader.fault(
      pointer,
      `Give one for each of the ${spans + 1} props; “rigid” where it does not give.`,
    );
  }
  return list.some((one) => one === undefined) ? undefined : (list as (QuantityInput | null)[]);
}

function readWaivers({ waivers }: WalerDraft, reader: FieldReader): WalerRequest['waive'] {
  if (waivers.length === 0) return undefined;
  waivers.forEach(({ reason }, index) => {
    if (reason.trim() === '') reader.fault(`/waive/${index}/reason`, 'Give the reason.');
  });
  return waivers.map(({ verification, reason }) => ({ verification, reason })) as NonNullable<
    WalerRequest['waive']
  >;
}
