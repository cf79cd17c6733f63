import { describe, expect, it } from 'vitest';
import { polynomial } from '../../src/numeric/polynomial.js';
import { gaussLegendre, integrateFromZero } from '../../src/numeric/quadrature.js';

describe('gaussLegendre', () => {
  it('has the published nodes and weights of the three-point rule', () => {
    const { nodes, weights } = gaussLegendre(3);
    const [root, outer, inner] = [Math.sqrt(3 / 5), 5 / 9, 8 / 9];
    for (const [index, node] of [-root, 0, root].entries()) expect(nodes[index]).toBeCloseTo(node, 15);
    for (const [index, weight] of [outer, inner, outer].entries())
      expect(weights[index]).toBeCloseTo(weight, 15);
  });

  it('integrates powers exactly up to twice its nodes less one', () => {
    for (const count of [1, 2, 5, 16, 32]) {
      const rule = gaussLegendre(count);
      for (let power = 0; power < 2 * count; power++) {
        expect(integrateFromZero((u) => u ** power, 1, rule)).toBeCloseTo(1 / (power + 1), 14);
      }
    }
  });

  it('stretches to any length', () => {
    const rule = gaussLegendre(32);
    expect(integrateFromZero(Math.cos, 3, rule)).toBeCloseTo(Math.sin(3), 14);
  });
});

describe('polynomial', () => {
  it('takes its coefficients from the lowest power up', () => {
    expect(polynomial(10, [4, 3, 2])).toBe(234);
    expect(polynomial(10, [])).toBe(0);
  });
});
