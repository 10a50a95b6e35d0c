import cfChs from './catalogue/cf-chs.json';
import cfRhs from './catalogue/cf-rhs.json';
import cfShs from './catalogue/cf-shs.json';
import chs from './catalogue/chs.json';
import flats from './catalogue/flats.json';
import hd from './catalogue/hd.json';
import heX from './catalogue/he-x.json';
import hea from './catalogue/hea.json';
import heaa from './catalogue/heaa.json';
import heb from './catalogue/heb.json';
import hem from './catalogue/hem.json';
import hl from './catalogue/hl.json';
import hp from './catalogue/hp.json';
import ipe from './catalogue/ipe.json';
import ipea from './catalogue/ipea.json';
import ipeaa from './catalogue/ipeaa.json';
import ipeo from './catalogue/ipeo.json';
import iper from './catalogue/iper.json';
import ipev from './catalogue/ipev.json';
import ipn from './catalogue/ipn.json';
import equalAngles from './catalogue/l-equal.json';
import unequalAngles from './catalogue/l-unequal.json';
import pfc from './catalogue/pfc.json';
import rhs from './catalogue/rhs.json';
import rounds from './catalogue/rounds.json';
import shs from './catalogue/shs.json';
import squares from './catalogue/squares.json';
import timber from './catalogue/timber.json';
import ub from './catalogue/ub.json';
import ubp from './catalogue/ubp.json';
import uc from './catalogue/uc.json';
import upe from './catalogue/upe.json';
import upn from './catalogue/upn.json';
import type { FamilyFile, ShapeReader } from './family-file';
import type { Forming } from './shapes/hollow';

type Numbers = Parameters<ShapeReader>[0];

const flanged = (of: Numbers) => ({
  h: of('h'),
  b: of('b'),
  t_w: of('tw'),
  t_f: of('tf'),
  r: of('r'),
});
const taperOf = (of: Numbers) => ({
  taper: { slope: of('slope'), at: of('at'), r_2: of('r2') },
});

const rolled: ShapeReader = (of) => ({ shape: 'I', fabrication: 'rolled', ...flanged(of) });
const rolledTapered: ShapeReader = (of) => ({ ...rolled(of), ...taperOf(of) });
const channel: ShapeReader = (of) => ({ shape: 'channel', ...flanged(of) });
const channelTapered: ShapeReader = (of) => ({ ...channel(of), ...taperOf(of) });
const angle: ShapeReader = (of) => ({
  shape: 'angle',
  h: of('h'),
  b: of('b'),
  t: of('t'),
  r_1: of('r1'),
  r_2: of('r2'),
});
const hollow =
  (forming: Forming): ShapeReader =>
  (of) => ({
    shape: 'RHS',
    h: of('h'),
    b: of('b'),
    t: of('t'),
    r_o: of('ro'),
    r_i: of('ri'),
    forming,
  });
const tube =
  (forming: Forming): ShapeReader =>
  (of) => ({ shape: 'CHS', d: of('d'), t: of('t'), forming });
const rectangle: ShapeReader = (of) => ({ shape: 'rectangle', b: of('b'), h: of('h') });
const square: ShapeReader = (of) => ({ shape: 'rectangle', b: of('a'), h: of('a') });
const round: ShapeReader = (of) => ({ shape: 'round', d: of('d') });

/** Every family, in the order of the list, with how its rows are read. */
export const familyFiles: readonly (readonly [file: FamilyFile, shapeOf: ShapeReader])[] = [
  ...[ub, uc, ubp, hea, heb, hem, heaa, heX, hd, hl, hp].map((file) => [file, rolled] as const),
  ...[ipe, ipea, ipeaa, ipeo, iper, ipev].map((file) => [file, rolled] as const),
  [ipn, rolledTapered],
  [pfc, channel],
  [upe, channel],
  [upn, channelTapered],
  [equalAngles, angle],
  [unequalAngles, angle],
  [rhs, hollow('hot-finished')],
  [shs, hollow('hot-finished')],
  [chs, tube('hot-finished')],
  [cfRhs, hollow('cold-formed')],
  [cfShs, hollow('cold-formed')],
  [cfChs, tube('cold-formed')],
  [flats, rectangle],
  [squares, square],
  [rounds, round],
  [timber, rectangle],
];
