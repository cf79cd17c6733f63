/**
 * The upper normal tail over the normal density, for z from 0 to 39 (beyond which both are 0).
 *
 * *Formula*: Mills' ratio Φ̄(z)/φ(z) by one rational function of degree 10 over 11; its coefficients are all
 * positive, so no digits are lost.
 * *Source*: weighted least squares in 60 digits: test/reference/distributions/mills_ratio.py.
 * *Accuracy*: relative 1e-18 in exact arithmetic, 1e-15 as computed (normal.json).
 */
export function millsRatio(z: number): number {
  const s = z * z;
  const above =
    1.2533141373155003 +
    s *
      (1.7034965972572649 +
        s *
          (0.3309806241491128 +
            s * (0.017853657642654043 + s * (0.0002671225611212605 + s * 5.618962674453996e-7)))) +
    z *
      (2.075278628024762 +
        s *
          (0.8957087541015439 +
            s * (0.08940271919472438 + s * (0.0026060525641630615 + s * 1.748493187637912e-5))));
  const below =
    1 +
    s *
      (2.8169768144717926 +
        s *
          (0.9800743583335455 +
            s * (0.09197380218788369 + s * (0.002623537496244089 + s * 1.748493187640903e-5)))) +
    z *
      (2.4537173374679755 +
        s *
          (2.0013973458140213 +
            s *
              (0.348305648395073 +
                s * (0.01811965640219355 + s * (0.0002676844573855341 + s * 5.618962674452709e-7)))));
  return above / below;
}
