import type { Option } from '../fields/choice-field';
import type { MaterialInput, QuantityInput, SectionRequest, SteelByGrade } from '../contract';

/** Every way in which a request names its material. */
export type AnyMaterial = MaterialInput | SectionRequest['material'];

const GRADES = ['S235', 'S275', 'S355', 'S450', 'S460'];

/** The grade of a steel; `kept` for a material that the form does not write itself. */
export function writeGrade(material: AnyMaterial | undefined): string {
  if (!material) return '';
  return 'grade' in material ? material.grade : 'kept';
}

/** A material that is no grade of steel, in words. */
export function materialText(material: AnyMaterial | undefined): string {
  if (!material || 'grade' in material) return '';
  if ('fy' in material)
    return `f_y ${material.fy}${typeof material.fy === 'number' ? ' N/mm²' : ''}`;
  return 'class' in material ? material.class : 'timber by strengths';
}

/** The steel grades, and the material of the request where it is none of them. */
export function gradeOptions(material: AnyMaterial | undefined, grade: string): readonly Option[] {
  const own = material && !('grade' in material);
  const others = grade !== '' && grade !== 'kept' && !GRADES.includes(grade) ? [grade] : [];
  return [
    ...(grade === '' ? [{ value: '', label: 'choose' }] : []),
    ...[...GRADES, ...others].map((value) => ({ value, label: value })),
    ...(own ? [{ value: 'kept', label: materialText(material) }] : []),
  ];
}

/** The material that a grade stands for; the one that came from outside where it was not changed. */
export function readMaterial<Material extends AnyMaterial>(
  kept: Material | undefined,
  grade: string,
): Material | SteelByGrade | undefined {
  if (grade === writeGrade(kept)) return kept;
  if (grade === '') return undefined;
  const { E, G } = (kept ?? {}) as { E?: QuantityInput; G?: QuantityInput };
  return { type: 'steel', grade, ...(E !== undefined && { E }), ...(G !== undefined && { G }) };
}
