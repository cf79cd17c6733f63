/**
 * What each arm adds to the variance of the difference, as a share of σ²: individuals in control, treatment
 * groups in the active arm.
 *
 * Formula: 1/n₀ and (1 + (m − 1)ρ)/(g·m).
 * Source: Roberts & Roberts 2005, Clin Trials 2:152; Moerbeek & Wong 2008, Stat Med 27:2850.
 * Units: n₀ control participants, g groups of m participants, ρ the ICC within a group.
 */
export function armVariances(
  controls: number,
  groups: number,
  groupSize: number,
  icc: number,
): [number, number] {
  return [1 / controls, (1 + (groupSize - 1) * icc) / (groups * groupSize)];
}

/**
 * Satterthwaite's df of a difference between two independently estimated variances.
 *
 * Formula: (a + b)²/(a²/(n₀ − 1) + b²/(g − 1)).
 * Source: Satterthwaite 1946, Biometrics Bull 2:110, on n₀ − 1 and g − 1 as in Roberts & Roberts 2005.
 * Units: a and b in any one unit.
 */
export function satterthwaiteDf(
  [control, active]: readonly [number, number],
  controls: number,
  groups: number,
): number {
  const share = control / (control + active);
  return 1 / (share ** 2 / (controls - 1) + (1 - share) ** 2 / (groups - 1));
}
