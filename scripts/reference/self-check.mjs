/**
 * The reference against printed tables and calculations by hand: `node scripts/reference/self-check.mjs`.
 */
import { classAbout } from './classes.mjs';
import { effectiveArea, effectiveModulus } from './effective.mjs';
import { randomRequests } from './random.mjs';
import { expectedOf } from './reference.mjs';
import { bucklingShear, memberOf, plasticShear } from './resistances.mjs';
import { propertiesOf } from './sections.mjs';

/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {import('./sections.mjs').SectionI} SectionI */
/** @typedef {import('./reference.mjs').Effects} Effects */

/** @param {[h: number, b: number, tw: number, tf: number, r: number]} sizes @param {'rolled' | 'welded'} [fabrication] @returns {SectionI} */
function sectionI([h, b, tw, tf, r], fabrication = 'rolled') {
  return { shape: 'I', h, b, tw, tf, r, fabrication };
}

const heb300 = sectionI([300, 300, 11, 19, 27]);
const ipe330 = sectionI([330, 160, 7.5, 11.5, 18]);
const ipe450 = sectionI([450, 190, 9.4, 14.6, 21]);
const ubp = sectionI([361.4, 378.5, 20.3, 20.4, 15.2]);
const girder = sectionI([1240, 300, 6, 20, 0], 'welded');
/** @type {Section} */
const upe200 = { shape: 'channel', h: 200, b: 80, tw: 6, tf: 11, r: 13 };
/** @type {Section} */
const shs150 = { shape: 'RHS', h: 150, b: 150, t: 8, forming: 'hot-finished' };
/** @type {Section} */
const coldShs = { shape: 'RHS', h: 100, b: 100, t: 5, forming: 'cold-formed' };
/** @type {Section} */
const tube = { shape: 'CHS', d: 219.1, t: 10, forming: 'hot-finished' };

let failures = 0;

/** @param {string} what @param {number | null | undefined} found @param {number} known @param {number} [tolerance] relative */
function same(what, found, known, tolerance = 1e-3) {
  const holds = typeof found === 'number' && Math.abs(found / known - 1) <= tolerance;
  if (!holds) failures += 1;
  console.log(`${holds ? 'ok  ' : 'FAIL'} ${what}: ${found} (known ${known})`);
}

/** @param {Section} section @param {number} fy @param {Effects} effects @param {string} id */
function verified(section, fy, effects, id) {
  const expected = expectedOf({ material: { type: 'steel', fy }, section, effects });
  return expected.refused ? undefined : expected.verifications[id];
}

function checkProperties() {
  const heb = propertiesOf(heb300);
  same('HE 300 B A, cm²', heb.A / 1e2, 149.1);
  same('HE 300 B I_y, cm⁴', heb.I.y / 1e4, 25170);
  same('HE 300 B I_z, cm⁴', heb.I.z / 1e4, 8563);
  same('HE 300 B W_pl_y, cm³', heb.Wpl.y / 1e3, 1869);
  same('HE 300 B W_pl_z, cm³', heb.Wpl.z / 1e3, 870.1);
  const upe = propertiesOf(upe200);
  same('UPE 200 A, cm²', upe.A / 1e2, 29);
  same('UPE 200 W_pl_y, cm³', upe.Wpl.y / 1e3, 220.1);
  same('UPE 200 W_el_z, cm³', upe.Wel.z / 1e3, 34.43);
  same('UPE 200 W_pl_z, cm³', upe.Wpl.z / 1e3, 62.2);
  const square = propertiesOf(shs150);
  same('SHS 150x8 hot A, cm²', square.A / 1e2, 44.8, 2e-3);
  same('SHS 150x8 hot I, cm⁴', square.I.y / 1e4, 1491);
  same('SHS 150x8 hot W_pl, cm³', square.Wpl.y / 1e3, 237);
  const cold = propertiesOf(coldShs);
  same('SHS 100x5 cold A, cm²', cold.A / 1e2, 18.36);
  same('SHS 100x5 cold I, cm⁴', cold.I.y / 1e4, 271.1);
  same('SHS 100x5 cold W_pl, cm³', cold.Wpl.y / 1e3, 64.59);
  const round = propertiesOf(tube);
  same('CHS 219.1x10 A', round.A, (Math.PI / 4) * (219.1 ** 2 - 199.1 ** 2), 1e-9);
  same('CHS 219.1x10 I', round.I.z, (Math.PI / 64) * (219.1 ** 4 - 199.1 ** 4), 1e-9);
  same('CHS 219.1x10 W_pl', round.Wpl.y, (219.1 ** 3 - 199.1 ** 3) / 6, 1e-9);
  const welded = propertiesOf(girder);
  same('girder A', welded.A, 2 * 300 * 20 + 1200 * 6, 1e-9);
  same('girder I_y', welded.I.y, (300 * 1240 ** 3 - 294 * 1200 ** 3) / 12, 1e-9);
  same('girder W_pl_y', welded.Wpl.y, 300 * 20 * 1220 + (6 * 1200 ** 2) / 4, 1e-9);
}

/**
 * The girder by hand: rho 0.52970, a gap of 282.18 mm from 190.69 to 472.87 mm above the middle, which
 * moves the centroid by 32.087 mm; lambda_w 2.8451, chi_w 0.29173.
 */
function checkClass4() {
  same('IPE 330 S355 A_eff, mm²', effectiveArea(ipe330, 355).A, 6095);
  same('girder S355 W_eff_y, mm³', effectiveModulus(girder, 355, 'y'), 7.8425e6, 2e-4);
  const loaded = { section: girder, fy: 355, A: propertiesOf(girder).A, compression: 0 };
  same('girder class about y-y', classAbout(loaded, 'y'), 4);
  same('girder class about z-z, by its web', classAbout(loaded, 'z'), 4);
  same('girder V_bw, kN', (bucklingShear(memberOf(girder, 355), 'z') ?? 0) / 1e3, 430.5);
}

function checkResistances() {
  same('UBP M_c_y_Rd, kN m', verified(ubp, 345, { My: 1 }, 'bending-y')?.resistance, 1100, 3e-3);
  const half = (propertiesOf(ubp).A * 345 * 0.5) / 1e3;
  const left = verified(ubp, 345, { compression: half, My: 1 }, 'bending-axial-y');
  same('UBP M_N_y_Rd at n = 0.5, kN m', left?.resistance, 648, 3e-3);
  same('IPE 450 S355 V_pl_z, kN', plasticShear(memberOf(ipe450, 355), 'z') / 1e3, 1042);

  // By hand: A_w = 420.8·9.4 = 3955.5 mm², rho = 0.36 at 0.8 V_pl, W_pl_y 1702 cm³.
  const shear = 0.8 * 1042.1;
  const reduced = verified(ipe450, 355, { My: 1, Vz: shear }, 'bending-shear-y');
  same('IPE 450 M_V_y_Rd at 0.8 V_pl, kN m', reduced?.resistance, 551.0, 2e-3);
  const both = verified(tube, 355, { My: 60, Mz: 80 }, 'biaxial');
  same('CHS biaxial is by the resultant', both?.utilisation, (100 / (0.4375614 * 355)) ** 2, 1e-6);
  const sum = verified(upe200, 275, { tension: 200, My: 20, Mz: 3 }, 'biaxial');
  const byHand = 200 / 797.6 + 20 / 60.53 + 3 / 17.1;
  same('UPE 200 linear sum', sum?.utilisation, byHand);
}

/**
 * By hand. Girder: M_f 2598.6 kN m, M_pl 3365.4 kN m; 1000 kN leave M_f 1988.6 kN m. Hollow section:
 * V_bw is 0.83·86.4·epsilon·t²·2·f_y/sqrt(3) whatever the height. Thin channel: rho 0.56430, A_eff
 * 2632.0 mm², e_N,z 38.474 − 32.769 = 5.705 mm, W_eff,z 45087 mm³ by its web.
 */
function checkBuckling() {
  const shear = 0.8 * 430.5086;
  const without = verified(girder, 355, { My: 2000, Vz: shear }, 'bending-shear-y');
  same('girder 7.1', without?.utilisation, 0.6763);
  const effects = { compression: 1000, My: 2000, Vz: shear };
  same('girder 7.1 with N', verified(girder, 355, effects, 'bending-shear-y')?.effect, 0.74156);

  /** @type {Section} */
  const box = { shape: 'RHS', h: 400, b: 250, t: 4, forming: 'hot-finished' };
  const worse = verified(box, 355, { Vz: 100, Vy: -200 }, 'web-buckling-shear');
  same('RHS 400x250x4 V_bw, kN', worse?.resistance, 382.7);
  same('RHS 400x250x4 the worse direction, kN', worse?.effect, 200);
  /** @type {Section} */
  const square = { shape: 'RHS', h: 150, b: 150, t: 4, forming: 'cold-formed' };
  const loaded = { section: square, fy: 355, A: propertiesOf(square).A, compression: 0 };
  same('SHS 150x4 cold, class by h − 3 t', classAbout(loaded, 'y'), 4);

  /** @type {Section} */
  const thin = { shape: 'channel', h: 300, b: 100, tw: 4, tf: 10, r: 0 };
  const shifted = verified(thin, 355, { compression: 100 }, 'bending-axial-z');
  same('channel, N e_N,z alone', shifted?.utilisation, 0.14267);
  const besides = verified(thin, 355, { compression: 100, My: 10 }, 'bending-axial-z');
  same('channel, N e_N,z beside M_y', besides?.utilisation, 0.14267);
}

/** By hand: N_V of the HE 300 B 4686.2 kN at rho 0.36; V_pl of the tube 857.1 kN, rho 0.02778. */
function checkShear() {
  const member = memberOf(heb300, 355);
  const shear = (0.8 * plasticShear(member, 'z')) / 1e3;
  const left = verified(heb300, 355, { tension: 1000, Vz: shear }, 'bending-axial-y');
  same('HE 300 B N with V', left?.utilisation, 0.21339);
  const effects = { tension: 1000, Mz: 10, Vy: 300, Vz: 400 };
  same('CHS shear, kN', verified(tube, 355, effects, 'shear-z')?.effect, 500);
  const reduced = verified(tube, 355, effects, 'bending-shear-z')?.resistance;
  same('CHS M_V,z, kN m', reduced, 0.4375614 * 355 * (1 - 0.02778));
  const n = 1000 / ((6569.07 - 0.02778 * 4182) * 0.355);
  const both = verified(tube, 355, effects, 'bending-axial-z')?.resistance;
  same(
    'CHS M_N,z, kN m',
    both,
    (reduced ?? 0) * Math.min(1 - n ** 1.7, Math.cos((Math.PI / 2) * n)),
  );
}

/** What the random requests are made of. */
function countRequests() {
  /** @type {Record<string, number>} */
  const classes = {};
  /** @type {Record<string, number>} */
  const ids = {};
  for (const request of randomRequests()) {
    const expected = expectedOf(request);
    const name = expected.refused ? 'refused' : `class ${expected.section_class}`;
    classes[name] = (classes[name] ?? 0) + 1;
    for (const [id, { utilisation }] of Object.entries(
      expected.refused ? {} : expected.verifications,
    )) {
      ids[id] = (ids[id] ?? 0) + 1;
      if (utilisation !== null && !Number.isFinite(utilisation)) failures += 1;
    }
  }
  console.log('requests:', classes, '\nverifications:', ids);
  if ([1, 2, 3, 4].some((each) => (classes[`class ${each}`] ?? 0) < 40)) failures += 1;
}

checkProperties();
checkClass4();
checkResistances();
checkBuckling();
checkShear();
countRequests();
console.log(failures === 0 ? 'all hold' : `${failures} do not hold`);
process.exitCode = failures === 0 ? 0 : 1;
