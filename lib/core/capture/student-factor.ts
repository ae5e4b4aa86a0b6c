/** Two-sided 95 % points of Student's distribution for 1 to 30 degrees of freedom. */
const points: readonly number[] = [
  12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306, 2.262, 2.228, 2.201, 2.179, 2.16, 2.145, 2.131,
  2.12, 2.11, 2.101, 2.093, 2.086, 2.08, 2.074, 2.069, 2.064, 2.06, 2.056, 2.052, 2.048, 2.045, 2.042,
]

/** How many standard errors bound 95 %, for so many degrees of freedom; statistical tables, JCGM 100 (GUM) annex G. */
export const studentFactor = (freedom: number): number => points[freedom - 1] ?? 1.96 + 2.5 / freedom
