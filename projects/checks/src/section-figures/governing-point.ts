import type { CheckAnswer } from '../contract';

/** The point that governs an answer, where one does. */
export function governingPoint(answer: CheckAnswer): string | undefined {
  const { governing, utilisation, verifications } = answer;
  const alike = verifications.filter(({ id }) => id === governing);
  return (alike.find((one) => one.utilisation === utilisation) ?? alike[0])?.point;
}
