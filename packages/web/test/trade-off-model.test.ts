import { describe, expect, it } from 'vitest';
import { useDrafts } from '../src/features/designs/model/drafts';
import { holdSizes, resize, undoSizes } from '../src/features/designs/model/drafts-of-sizes';
import { finding, moveInWords, notes, sizeInWords } from '../src/features/trade-off/model/finding';
import { frontOfPairs } from '../src/features/trade-off/model/pareto';
import { type Choice, pictureOf } from '../src/features/trade-off/model/picture';
import { sizesCsv } from '../src/features/trade-off/model/sizes-csv';
import { sizeRows } from '../src/features/trade-off/model/sizes-table';
import { type WeighedBefore, type Weighing, weighingOf } from '../src/features/weigh/model/weighing';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import { option, type StudyFixture } from './fixtures/study-fixture';

const usual: Choice = { over: 'units', across: 'cost', up: 'power' };

/** The study as a person sees it who has these drafts. */
function weighed(fixture: StudyFixture, before?: WeighedBefore): Weighing {
  const { drafts, sizings } = useDrafts.getState();
  const draftOf = (id: string) => drafts[`me/${id}`];
  return weighingOf({ ...fixture, draftOf, sizing: sizings[`me/${fixture.study.id}`] }, before);
}

const draw = (weighing: Weighing, choice: Partial<Choice> = {}) =>
  pictureOf(weighing, { ...usual, ...choice }, undefined, new Map());

const at = (picture: ReturnType<typeof draw>, position: number, size: number) =>
  picture.drawn[position]?.curve.points.find((point) => point.size === size);

/** The demo's limits; the sizes below come from R, not from this program. */
function limited(): StudyFixture {
  const fixture = greenkettle();
  fixture.limits = {
    version: 1,
    limits: { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 },
  };
  return fixture;
}

describe('A picture', () => {
  it('runs each option through the sizes that R computed', () => {
    const picture = draw(weighed(greenkettle()));
    expect(at(picture, 0, 22)).toMatchObject({
      power: expect.closeTo(0.813, 3),
      cost: expect.closeTo(715_320, 0),
      clusters: 44,
      participants: 1760,
      months: 17,
    });
    expect(at(picture, 0, 16)?.power).toBeCloseTo(0.672, 3);
  });

  it('runs over the cluster size where the option has one, at the number it has', () => {
    const fixture = greenkettle();
    fixture.designSet.hold = { kind: 'sizes', power: 0.8 };
    fixture.designSet.options = [
      option('Cluster', { family: 'cluster', clusterSize: 40, units: 16 }),
      option('Individual', { family: 'parallel', units: 296 }),
    ];
    const weighing = weighed(fixture);
    const picture = draw(weighing, { over: 'clusterSize' });
    expect(picture.drawn.map(({ option: { letter } }) => letter)).toEqual(['A']);
    expect(at(picture, 0, 60)?.power).toBeCloseTo(0.726, 3);
    expect(notes(weighing, picture)).toContain('B is not drawn: it has no catchments.');
  });

  it('ends a curve at the largest size within the limits, and says which limit ends it', () => {
    const [series] = draw(weighed(limited())).data.series;
    expect(series?.end).toEqual({ size: 16, label: '≤ 32 catchments' });
  });

  it('draws in the hold, the target and the limit of the axis across', () => {
    const rules = (choice: Partial<Choice>) =>
      draw(weighed(limited()), choice).data.rules.map(({ axis, at: place, label, barred }) => {
        return [axis, place, label.replaceAll('\u00a0', ' '), barred];
      });
    expect(rules({})).toEqual([
      ['y', 0.8, 'hold: 80 %', 'below'],
      ['x', 800_000, 'over 800 k€', 'above'],
    ]);
    expect(rules({ across: 'clusters', up: 'detectable' })).toEqual([
      ['y', 3, 'target: 3 g/L', 'above'],
      ['x', 32, 'over 32 catchments', 'above'],
    ]);
    expect(rules({ over: 'clusterSize', across: 'clusterSize', up: 'halfWidth' })).toEqual([
      ['x', 60, 'over 60 in each catchment', 'above'],
    ]);
  });

  it('draws no limit of clusters where some of those recruited are lost', () => {
    const fixture = limited();
    const [first] = fixture.designSet.options;
    if (first) first.plan.overrides = { clusterAttrition: { value: 0.1, reason: 'Schools close.' } };
    const { data } = draw(weighed(fixture), { across: 'clusters' });
    expect(data.rules.filter(({ axis }) => axis === 'x')).toEqual([]);
    // 29 of the 32 that exist would be left, in two arms of 14.
    expect(data.series[0]?.end?.size).toBe(14);
  });

  it('detects the target difference at the size that the power asks for', () => {
    const picture = draw(weighed(stillfoot()), { up: 'detectable' });
    const [first] = picture.data.series;
    // One fewer would not detect it at 90 %.
    expect(first?.now?.y).toBeLessThanOrEqual(1);
    expect(first?.points.find(({ size }) => size === 93)?.y ?? 2).toBeGreaterThan(1);
  });

  it('falls back on participants where nothing costs anything', () => {
    const fixture = stillfoot();
    fixture.costs.costs = { currency: 'EUR' };
    const picture = draw(weighed(fixture));
    expect(picture.across.kind).toBe('participants');
    expect(picture.choices.across.map(({ kind }) => kind)).toEqual(['participants', 'months']);
  });

  it('keeps its curves while only sizes change', () => {
    const fixture = stillfoot();
    const known = new Map();
    const id = fixture.designSet.options[0]?.id ?? '';
    resize('me', weighed(fixture), id, { units: 81 });
    const first = pictureOf(weighed(fixture), usual, undefined, known);
    resize('me', weighed(fixture), id, { units: 80 });
    const second = pictureOf(weighed(fixture), usual, undefined, known);
    for (const [position, { curve }] of second.drawn.entries()) {
      expect(curve).toBe(first.drawn[position]?.curve);
    }
    expect(second.drawn[0]?.now?.size).toBe(80);
  });
});

describe('The front', () => {
  it('keeps what nothing beats on both counts, with ties', () => {
    const pairs = [
      [1, 5],
      [2, 3],
      [2, 3],
      [3, 3],
      [2, 4],
      [4, 1],
      [1, 6],
    ] as const;
    const front = frontOfPairs(pairs, (pair) => pair);
    expect(pairs.filter((pair) => front.has(pair))).toEqual([
      [1, 5],
      [2, 3],
      [2, 3],
      [4, 1],
    ]);
  });

  it('runs along the crossover, which beats the others at every cost', () => {
    const { data } = draw(weighed(stillfoot()));
    const places = data.series[2]?.points.map(({ x, y }) => `${x} ${y}`);
    for (const [x, y] of data.front.flat().filter(([cost]) => cost < 384_000)) {
      expect(places).toContain(`${x} ${y}`);
    }
  });

  it('does not count an option that was ruled out, nor one alone', () => {
    const fixture = stillfoot();
    for (const ruled of fixture.designSet.options.slice(1)) {
      ruled.ruling = { kind: 'not-admissible', reason: 'No.', by: 'T', at: '2026-11-20T10:00:00.000Z' };
    }
    expect(draw(weighed(fixture)).data.front).toEqual([]);
  });
});

describe('The finding', () => {
  const plain = (text: string | undefined) => text?.replaceAll('\u00a0', ' ');

  it('says who leads among those that reach the power', () => {
    const weighing = weighed(stillfoot());
    expect(plain(finding(weighing, draw(weighing)))).toBe(
      'Of the three options that reach 90 %, C costs least: 333 k€, against 446 k€ for B.',
    );
    expect(plain(finding(weighing, draw(weighing, { across: 'participants' })))).toBe(
      'Of the three options that reach 90 %, C takes the fewest participants: 40 participants, against 132 participants for B.',
    );
  });

  it('says so where options come to the same', () => {
    const fixture = stillfoot();
    fixture.designSet.options = [
      option('One', { family: 'parallel' }),
      option('Two', { family: 'parallel' }),
    ];
    const weighing = weighed(fixture);
    expect(plain(finding(weighing, draw(weighing)))).toBe(
      'Of the two options that reach 90 %, A and B come to the same: 490 k€.',
    );
  });

  it('says what one that breaks the limits would take', () => {
    const weighing = weighed(limited());
    expect(plain(finding(weighing, draw(weighing)))).toBe(
      'A does not reach 80 % within the limits: it has 81.3 % with 12 catchments over.',
    );
  });

  it('says what a move did', () => {
    const fixture = greenkettle();
    const before = weighed(fixture);
    const [first] = before.options;
    resize('me', before, first?.id ?? '', { units: 21 });
    const after = weighed(fixture);
    const says = first && after.options[0] && moveInWords(first, after.options[0], after);
    // Two catchments fewer: 2 × 5,500, and 900 + 4,700 for their periods, and 80 measurements of 22: 18,360.
    expect(plain(says)).toMatch(
      /^A now 42 catchments × 40: power 79\.\d %, 18 k€ less, no longer reaches 80 %\.$/,
    );
  });

  it('gives a marker its size and all it means in words', () => {
    const weighing = weighed(limited());
    const [first] = weighing.options;
    expect(plain(first && sizeInWords(first, weighing))).toBe(
      '44 catchments × 40, power 81.3 %, 715 k€, 17 months, 12 catchments over',
    );
  });

  it('tells of the power that no cluster size reaches', () => {
    const fixture = limited();
    fixture.designSet.hold = { kind: 'sizes', power: 0.8 };
    fixture.designSet.options = [option('Cluster', { family: 'cluster', clusterSize: 40, units: 12 })];
    const weighing = weighed(fixture);
    expect(plain(notes(weighing, draw(weighing, { over: 'clusterSize' }))[0])).toMatch(
      /^A cannot reach 80 % however many girls each catchment gives: at most \d\d\.\d % with 12 catchments in each arm\.$/,
    );
  });

  it('says why an option is not drawn', () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    const weighing = weighed(fixture);
    expect(notes(weighing, draw(weighing))[0]).toMatch(/^D is not drawn\. State the ICC/);
  });
});

describe('The figures', () => {
  it('hold a few sizes of each option, in order, with the one it has', () => {
    const rows = sizeRows(draw(weighed(stillfoot())));
    const sizes = rows.filter(({ option: { letter } }) => letter === 'A').map(({ point }) => point.size);
    expect(sizes).toEqual(sizes.toSorted((a, b) => a - b));
    expect(rows.filter(({ now }) => now).map(({ point }) => point.size)).toEqual([94, 66, 20]);
  });

  it('go into a file with every size, and nothing that a spreadsheet would run', () => {
    const fixture = stillfoot();
    const [first] = fixture.designSet.options;
    if (first) first.name = '=cmd|" /C calc"!A0';
    const weighing = weighed(fixture);
    const picture = draw(weighing);
    const [heads, ...rows] = sizesCsv(picture, weighing).trimEnd().split('\r\n');
    expect(heads).toContain('"Cost (EUR)"');
    expect(rows.length).toBeGreaterThanOrEqual(picture.drawn.flatMap(({ curve }) => curve.points).length);
    expect(rows[0]).toContain(`"A","'=cmd|"" /C calc""!A0","Participants in each arm",`);
    expect(rows.find((row) => row.includes(',94,') && row.endsWith('"yes"'))).toMatch(/,188,,490254\.\d+,/);
  });
});

describe('Sizes that are tried out', () => {
  it('enter every option at the size it had, and hold the sizes', () => {
    const fixture = stillfoot();
    const before = weighed(fixture);
    resize('me', before, fixture.designSet.options[0]?.id ?? '', { units: 80 });
    const { hold, options } = weighed(fixture);
    expect(hold).toEqual({ kind: 'sizes', power: 0.9 });
    expect(options.map(({ appraisal }) => appraisal?.feasible && appraisal.units)).toEqual([80, 66, 20]);
  });

  it('are those that the options have, where sizes are held without moving one', () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    holdSizes('me', weighed(fixture));
    const { hold, options } = weighed(fixture);
    expect(hold).toEqual({ kind: 'sizes', power: 0.9 });
    // What cannot be sized has none to be entered.
    expect(options.map(({ draft }) => draft?.plan.units)).toEqual([94, 66, 20, undefined]);
    undoSizes('me', weighed(fixture));
    expect(weighed(fixture).hold.kind).toBe('power');
    expect(useDrafts.getState().drafts).toEqual({});
  });

  it('go back to what was stated before, other edits aside', () => {
    const fixture = stillfoot();
    const [first] = fixture.designSet.options;
    resize('me', weighed(fixture), first?.id ?? '', { units: 80 });
    const key = `me/${first?.id}`;
    const draft = useDrafts.getState().drafts[key];
    if (draft)
      useDrafts.setState(({ drafts }) => ({ drafts: { ...drafts, [key]: { ...draft, name: 'Mine' } } }));
    undoSizes('me', weighed(fixture));
    const { hold, options } = weighed(fixture);
    expect(hold.kind).toBe('power');
    expect(options.map(({ name, draft: kept }) => [name, kept?.plan.units])).toEqual([
      ['Mine', undefined],
      ['Parallel, baseline-adjusted', undefined],
      ['Crossover', undefined],
    ]);
    expect(Object.keys(useDrafts.getState().drafts)).toEqual([key]);
  });

  it('weigh anew only the option that is moved', () => {
    const fixture = stillfoot();
    const known: WeighedBefore = new Map();
    const id = fixture.designSet.options[0]?.id ?? '';
    resize('me', weighed(fixture, known), id, { units: 80 });
    const first = weighed(fixture, known);
    resize('me', first, id, { units: 81 });
    const second = weighed(fixture, known);
    expect(second.options.map((each, position) => each === first.options[position])).toEqual([
      false,
      true,
      true,
    ]);
  });
});
