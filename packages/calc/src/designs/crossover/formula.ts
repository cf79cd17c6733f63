/**
 * Standard error of the treatment effect in an AB/BA crossover analysed within participants.
 *
 * Formula: σ√(2(1 − ρ)/N), with period effects; its df is N − 2.
 * Source: Senn 2002, Cross-over Trials in Clinical Research; Jones & Kenward 2014.
 * Units: σ in the outcome's own, ρ the correlation of two periods of one participant, N participants in both
 * sequences together (equal numbers in each).
 */
export function abbaStandardError(sd: number, correlation: number, participants: number): number {
  return sd * Math.sqrt((2 * (1 - correlation)) / participants);
}
