import { silentSheet } from '../formula/sheet';
import { catalogue, findSection, formingIsSaid, similarSections } from './catalogue';
import { designationKey } from './designation';
import { propertiesOf } from './properties';

test.each([
  ['457 x 191 x 67 UB', 'UB 457x191x67'],
  ['UB457x191x67', 'UB 457x191x67'],
  ['ub 457×191×67', 'UB 457x191x67'],
  ['610x229x125 UKB', 'UB 610x229x125'],
  ['IPE200', 'IPE 200'],
  ['HEB 200', 'HE 200 B'],
  ['he200b', 'HE 200 B'],
  ['IPE A 100', 'IPE A 100'],
  ['IPEA100', 'IPE A 100'],
  ['UPN200', 'UPN 200'],
  ['UNP 200', 'UPN 200'],
  ['inp 300', 'IPN 300'],
  ['PFC 200x90x30', 'PFC 200x90x30'],
  ['200 x 90 x 30 UKPFC', 'PFC 200x90x30'],
  ['L100x100x10', 'L 100x100x10'],
  ['100 x 100 x 10 UKA', 'L 100x100x10'],
  ['L 100x10', 'L 100x100x10'],
  ['L 150x100x12', 'L 150x100x12'],
  ['150 x 150 x 8 SHS', 'SHS 150x150x8'],
  ['SHS150*150*8', 'SHS 150x150x8'],
  ['SHS 150x8', 'SHS 150x150x8'],
  ['RHS 150x150x8', 'SHS 150x150x8'],
  ['HF SHS 150x150x8', 'SHS 150x150x8'],
  ['HFSHS 150 x 150 x 8.0', 'SHS 150x150x8'],
  ['hot-finished SHS 150x150x8', 'SHS 150x150x8'],
  ['SHS 150x150x8 hot finished', 'SHS 150x150x8'],
  ['SHS 150x150x8 EN 10210-2', 'SHS 150x150x8'],
  ['CF SHS 150x150x8', 'CF SHS 150x150x8'],
  ['CFSHS 150x150x8', 'CF SHS 150x150x8'],
  ['RHS 150x150x8 cold formed', 'CF SHS 150x150x8'],
  ['RHS 200x100x8 cold-formed', 'CF RHS 200x100x8'],
  ['200x100x8 RHS (EN 10219)', 'CF RHS 200x100x8'],
  ['RHS 200x100x8', 'RHS 200x100x8'],
  ['SHS 19x19x1.6', 'CF SHS 19x19x1.6'],
  ['CHS 114,3x5', 'CHS 114.3x5'],
  ['CHS 114.3 x 5.0', 'CHS 114.3x5'],
  ['chs Ø114.3 × 5', 'CHS 114.3x5'],
  ['cold-formed CHS 114.3x5', 'CF CHS 114.3x5'],
  ['flat 100x10', 'FL 100x10'],
  ['R20', 'R 20'],
  ['SQ20', 'SQ 20'],
  ['47 x 150 timber', 'timber 47x150'],
])('%s is found as %s', (spelling, designation) => {
  expect(findSection(spelling)?.designation).toBe(designation);
});

test('every section is found by its own designation', () => {
  const lost = catalogue.filter((entry) => findSection(entry.designation) !== entry);
  expect(lost).toEqual([]);
});

test.each([
  'SHS 150x150',
  'RHS 100x200x8',
  'HF SHS 19x19x1.6',
  '150x150x8',
  'SHS',
  '',
  'FL 10x100',
])('nothing answers to "%s"', (designation) => expect(findSection(designation)).toBeUndefined());

test.each([
  ['SHS 150x150x8', false],
  ['RHS 150x150x8', false],
  ['CHS 114.3x5', false],
  ['CF SHS 150x150x8', true],
  ['hot-finished SHS 150x150x8', true],
  // Made cold only, and hot only.
  ['SHS 19x19x1.6', true],
  ['CHS 508x40', true],
  ['UB 457x191x67', true],
  ['timber 47x150', true],
])('whether the forming of %s is said: %p', (designation, said) => {
  expect(formingIsSaid(designation)).toBe(said);
});

test('hot-finished and cold-formed are two sections', () => {
  const area = (designation: string): number => {
    const entry = findSection(designation);
    return entry ? propertiesOf(entry, silentSheet).A : NaN;
  };
  expect(area('SHS 150x150x8')).toBeGreaterThan(area('CF SHS 150x150x8'));
});

test.each([
  ['UB 457x191x68', 'UB 457x191x67'],
  ['SHS 150x150x9', 'SHS 150x150x8'],
  ['HF SHS 150x150x9', 'SHS 150x150x8'],
  ['CF RHS 200x100x7', 'CF RHS 200x100x6'],
  ['L 100x150x12', 'L 150x100x12'],
  ['RHS 100x200x6.3', 'RHS 200x100x6.3'],
  ['UX 457x191x67', 'UB 457x191x67'],
])('near %s is %s', (designation, near) => {
  expect(similarSections(designation)).toContain(near);
});

test.each([
  ['457 x 191 x 67 UB', 'UB 457x191x67'],
  ['HE 200 B', 'HEB 200'],
  ['RHS 150x150x8 cold-formed', 'CF SHS 150x150x8'],
])('the key of %s is %s', (text, key) => {
  expect(designationKey(text)).toBe(key);
});
