import type { AdvisoryAnswer } from '../contract';
import type { SteelSection } from './section';

/** BS 5975 wants more of steel that is used again than the Eurocode's factor. */
export function factorAdvisory(gamma_M0: number): AdvisoryAnswer[] {
  if (gamma_M0 >= 1.1) return [];
  return [
    {
      code: 'material-factor-below-1.10',
      severity: 'caution',
      message: `The profile takes γM0 = ${gamma_M0}. For steel temporary works, other than single-use, BS 5975 asks for at least 1.10.`,
      clause: 'BS 5975:2019 13.3.9',
    },
  ];
}

/** Cautions that go with a steel section, whatever is checked of it. */
export function sectionAdvisories(section: SteelSection): AdvisoryAnswer[] {
  const { gamma_M0, overridden, formingAssumed, name } = section;
  const list = factorAdvisory(gamma_M0);
  if (formingAssumed) {
    list.push({
      code: 'forming-assumed',
      severity: 'caution',
      message: `${name} is taken as hot-finished (EN 10210). A cold-formed one of the same size (EN 10219) is less; name it as "CF ${name}".`,
    });
  }
  if (overridden.length > 0) {
    list.push({
      code: 'properties-given',
      severity: 'caution',
      message: `Properties are the caller's own: ${overridden.join(', ')}.`,
    });
  }
  return list;
}
