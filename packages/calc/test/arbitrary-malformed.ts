import fc from 'fast-check';
import type { AppraisalRequest } from '../src/index.js';
import { requestsFor } from './arbitrary-requests.js';
import { everyCombination, isComputed } from './combinations.js';

type Json = Record<string, unknown>;

const lost = fc.constantFrom(0, 0.1, 0.5, 0.999);
const rate = fc.constantFrom(0, 1, 250, 1e6);
const months = fc.constantFrom(0, 1.5, 12, 1200);

const costs = fc
  .record({
    rates: fc.record(
      {
        fixed: rate,
        perArm: rate,
        perCluster: rate,
        perRecruited: rate,
        perMeasurement: rate,
        perMonth: rate,
        overhead: lost,
      },
      { requiredKeys: [] },
    ),
    perExposure: fc.array(rate, { minLength: 2, maxLength: 4 }),
    listed: fc.integer({ min: 0, max: 9 }),
  })
  .map(({ rates, perExposure, listed }) => ({
    currency: 'EUR',
    ...rates,
    ...(listed === 0 ? { perExposure } : {}),
  }));
const timeline = fc.record(
  {
    startUp: months,
    accrualPerMonth: fc.constantFrom(1e-12, 4, 1e9),
    followUp: months,
    period: months,
    washout: months,
    closeOut: months,
  },
  { requiredKeys: [] },
);
const aims = fc.oneof(
  fc.record({ find: fc.constant('power'), units: fc.constantFrom(1, 2, 5, 40, 1e9) }),
  fc.record({
    find: fc.constantFrom('effect', 'cluster-size'),
    units: fc.constantFrom(2, 5, 40, 1e9),
    power: fc.constantFrom(0.2, 0.5, 0.8, 0.999999),
  }),
  fc.record({ find: fc.constant('size'), power: fc.constantFrom(0.2, 0.8, 0.999999) }),
);

/** Parts that any request may have, or may not. */
const extras = fc.record(
  {
    attrition: fc.record({ participants: lost }),
    dilution: fc.record({ contamination: lost, nonAdherence: lost }, { requiredKeys: [] }),
    costs,
    timeline,
    aim: aims,
  },
  { requiredKeys: [] },
);

const odd = fc.oneof(
  {
    arbitrary: fc.constantFrom<unknown>(0, -0, 1, -1, 2, 3, 0.5, 1.5, 1e-300, 5e-324, 1e-12, 1e-9),
    weight: 4,
  },
  {
    arbitrary: fc.constantFrom<unknown>(1e9, 1e12, -1e12, 1e15, 1e300, 0.999999999999, 1 - 2 ** -53),
    weight: 3,
  },
  { arbitrary: fc.double(), weight: 2 },
  {
    arbitrary: fc.constantFrom<unknown>(
      null,
      undefined,
      true,
      '',
      'AB',
      '1',
      [],
      {},
      [[]],
      [1],
      [0, 0],
      Number.NaN,
    ),
    weight: 2,
  },
  {
    arbitrary: fc.constantFrom<unknown>('__proto__', 'constructor', 'superiority', 'lower', 'normal'),
    weight: 1,
  },
  { arbitrary: fc.anything({ maxDepth: 2, maxKeys: 3 }), weight: 1 },
);

const mutation = fc.record({
  kind: fc.constantFrom('scale', 'scale', 'scale', 'scale', 'scale', 'set', 'remove', 'add', 'repeat'),
  at: fc.nat(),
  value: odd,
  factor: fc.constantFrom(-1, 0, 1e-300, 1e-12, 1e-6, 0.01, 0.5, 0.999999, 2, 10, 1000, 1e6, 1e9),
  key: fc.constantFrom(
    'sd',
    'icc',
    'margin',
    'method',
    'comparisons',
    'allocation',
    'toString',
    'extra',
    '0',
  ),
});
type Mutation = typeof mutation extends fc.Arbitrary<infer M> ? M : never;

/** Every place in a value: its container and the key in it. */
function placesIn(value: unknown): [Json, string][] {
  if (value === null || typeof value !== 'object') return [];
  return Object.keys(value).flatMap((key) => {
    const inner = (value as Json)[key];
    return [[value as Json, key] as [Json, string], ...placesIn(inner)];
  });
}

function mutate(request: Json, { kind, at, value: shared, factor, key }: Mutation): void {
  // A value put into one request must not be changed by the next.
  const value = structuredClone(shared);
  const everywhere = placesIn(request);
  const places =
    kind === 'scale'
      ? everywhere.filter(([container, name]) => typeof container[name] === 'number')
      : everywhere;
  const place = places[at % places.length];
  if (!place) return;
  const [container, name] = place;
  const inner = container[name];
  if (kind === 'scale') {
    const scaled = (inner as number) * factor;
    container[name] = Number.isInteger(inner) && at % 2 === 0 ? Math.round(scaled) : scaled;
  } else if (kind === 'remove') {
    if (Array.isArray(container)) container.splice(Number(name), 1);
    else delete container[name];
  } else if (kind === 'repeat' && Array.isArray(inner)) {
    inner.push(...structuredClone(inner));
  } else if (kind === 'add' && inner !== null && typeof inner === 'object') {
    Object.defineProperty(inner, key, { value, enumerable: true, writable: true, configurable: true });
  } else {
    container[name] = value;
  }
}

/** Requests of any combination, with parts added, one or two of their places spoilt. */
export const malformed = fc
  .record({
    request: fc.oneof(...everyCombination.filter(isComputed).map(requestsFor)),
    extras,
    mutations: fc.array(mutation, { minLength: 1, maxLength: 2 }),
  })
  .map(({ request, extras, mutations }) => {
    const changed = structuredClone({ ...request, ...extras }) as unknown as Json;
    for (const each of mutations) mutate(changed, each);
    return changed as unknown as AppraisalRequest;
  });
