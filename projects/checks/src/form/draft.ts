import type { AxialLoad, Load, WalerRequest } from '../contract';

/** How a load acts, as the table names it; `thrust` runs along the member. */
export type LoadShape = Load['kind'] | 'thrust';

/** A load as it is typed. */
export interface LoadRow {
  /** Tells rows apart while they move; never sent. */
  readonly id: number;
  readonly name: string;
  readonly nature: Load['nature'];
  readonly category: string;
  readonly shape: LoadShape;
  /** The value, or the value where a linear load begins. */
  readonly value: string;
  /** The value where a linear load ends. */
  readonly end: string;
  /** The width that an area load is carried from. */
  readonly width: string;
  readonly from: string;
  readonly to: string;
  /** Where a point load or a moment acts. */
  readonly at: string;
  /** What the row came from: what it holds beyond the table is kept. */
  readonly kept: Load | AxialLoad | null;
}

/** A waiver as it is typed. */
export interface WaiverRow {
  readonly id: number;
  readonly verification: string;
  readonly reason: string;
}

/** How the compression flange is held; `kept` is a way that the form does not write itself. */
export type RestraintWord = 'full' | 'at-supports' | 'spacing' | 'kept';

/** The form as it is typed: texts, so that nothing is lost while it cannot be read. */
export interface WalerDraft {
  /** What came from outside; what the form does not show stays in it. */
  readonly kept: Partial<WalerRequest>;
  readonly profile: string;
  readonly section: string;
  /** One member, or twin members side by side. */
  readonly count: '1' | '2';
  /** A grade, or `kept` for a material that is no grade of steel. */
  readonly grade: string;
  readonly loadBasis: WalerRequest['loadBasis'];
  readonly spans: string;
  readonly overhangStart: string;
  readonly overhangEnd: string;
  readonly restraint: RestraintWord;
  readonly restraintSpacing: string;
  readonly bearingLength: string;
  readonly endDistance: string;
  readonly loadLevel: NonNullable<WalerRequest['loadLevel']>;
  readonly deflectionLimit: string;
  readonly supports: NonNullable<WalerRequest['supports']>;
  readonly stiffness: string;
  readonly selfWeight: boolean;
  readonly rows: readonly LoadRow[];
  readonly waivers: readonly WaiverRow[];
}

let lastId = 0;

/** A number that tells rows apart. */
export function nextId(): number {
  lastId += 1;
  return lastId;
}

/** A row with nothing in it. */
export function emptyRow(): LoadRow {
  return {
    id: nextId(),
    name: '',
    nature: 'permanent',
    category: '',
    shape: 'uniform',
    value: '',
    end: '',
    width: '',
    from: '',
    to: '',
    at: '',
    kept: null,
  };
}

/** Whether nothing was typed into a row. */
export function isEmptyRow(row: LoadRow): boolean {
  return [row.name, row.value, row.end, row.width, row.from, row.to, row.at].every(
    (text) => text.trim() === '',
  );
}

/** A row's place in the request. */
export function rowPointer(rows: readonly LoadRow[], row: LoadRow): string {
  const thrust = row.shape === 'thrust';
  const alike = rows.filter((one) => !isEmptyRow(one) && (one.shape === 'thrust') === thrust);
  const index = alike.indexOf(row);
  return `${thrust ? '/thrust' : '/loads'}/${index < 0 ? alike.length : index}`;
}
