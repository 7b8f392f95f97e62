/** Minimum yield strength by grade, psi. Source: API 5CT. Chemistry is not fixed by a grade's name. */
export const CASING_GRADES = {
  H40: 40_000,
  J55: 55_000,
  K55: 55_000,
  M65: 65_000,
  L80: 80_000,
  N80: 80_000,
  R95: 95_000,
  P110: 110_000,
  Q125: 125_000,
} as const;

export type CasingGrade = keyof typeof CASING_GRADES;

/** The grade as it may be written (`J-55`, `j55`), or null. */
export const gradeNamed = (text: string): CasingGrade | null => {
  const name = text.toUpperCase().replace(/[\s-]/g, '');
  return Object.hasOwn(CASING_GRADES, name) ? (name as CasingGrade) : null;
};
