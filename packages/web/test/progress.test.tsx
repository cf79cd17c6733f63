import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { progressOf } from '../src/features/studies/model/progress';
import { stillfoot } from './fixtures/stillfoot';
import { openApp } from './open-app';
import { serve } from './server';

const estimand = {
  population: 'Adults with stable pain',
  treatment: 'Gel against vehicle',
  variable: 'Mean pain',
  intercurrentEvents: [{ event: 'Rescue medication', strategy: 'treatment-policy' as const }],
  summary: 'Difference of means',
};

describe('How far a study has got', () => {
  it('is in part where basis, estimand or source are wanting', () => {
    const { question, ledger, costs, weigh } = progressOf(stillfoot());
    expect(question).toEqual({
      mark: 'part',
      says: 'In part: the basis of the target difference is not stated',
    });
    expect(ledger.mark).toBe('done');
    expect(costs).toEqual({ mark: 'part', says: 'In part: nobody has said where the figures come from' });
    expect(weigh).toEqual({ mark: 'part', says: 'In part: no choice is recorded' });
  });

  it('is done where all is stated and the choice recorded', () => {
    const fixture = stillfoot();
    Object.assign(fixture.study, { basis: { kind: 'both', toWhom: 'A panel', why: 'Asked' }, estimand });
    fixture.costs.source = 'Quotations of May';
    fixture.designSet.choice = {
      optionId: fixture.designSet.options[2]?.id ?? '',
      why: 'Cheapest',
      whyNot: [],
      by: 'Tomas Arrivel',
      at: '2026-11-20T10:00:00.000Z',
    };
    const marks = Object.values(progressOf(fixture)).map(({ mark }) => mark);
    expect(marks).toEqual(['done', 'done', 'done', 'done']);
  });

  it('counts attributes of the estimand that stay empty as open', () => {
    const fixture = stillfoot();
    Object.assign(fixture.study, {
      basis: { kind: 'both', toWhom: 'A panel', why: 'Asked' },
      estimand: { ...estimand, population: '' },
    });
    expect(progressOf(fixture).question.says).toBe('In part: the estimand has open attributes');
  });

  it('counts values that are assumed and wait to be replaced', () => {
    const fixture = stillfoot();
    for (const line of fixture.ledger.slice(0, 2)) line.source = 'assumed, replace';
    expect(progressOf(fixture).ledger).toEqual({
      mark: 'part',
      says: 'In part: two values are “assumed, replace”',
    });
  });

  it('misses a figure that an option needs', () => {
    const fixture = stillfoot();
    fixture.costs.source = 'Quotations of May';
    delete fixture.costs.timeline.period;
    expect(progressOf(fixture).costs).toEqual({ mark: 'part', says: 'In part: an option lacks a figure' });
  });

  it('is to do where there is nothing', () => {
    const fixture = stillfoot();
    fixture.ledger = [];
    fixture.designSet.options = [];
    fixture.costs.costs = { currency: 'EUR' };
    fixture.costs.timeline = {};
    const { ledger, costs, weigh } = progressOf(fixture);
    expect([ledger.says, costs.says, weigh.says]).toEqual([
      'To do: no planning value is stated',
      'To do: no figure is stated',
      'To do: no option yet',
    ]);
  });

  it('is told beside the pages, in words too, and a letter that is ruled out is outlined there', async () => {
    const fixture = stillfoot();
    const [first] = fixture.designSet.options;
    if (first) {
      first.ruling = { kind: 'not-admissible', reason: 'No', by: 'T', at: '2026-11-20T10:00:00.000Z' };
    }
    serve(fixture);
    openApp(`/studies/${fixture.study.id}/weigh`);
    const list = await screen.findByRole('navigation', { name: 'Study' });
    expect(await within(list).findByRole('link', { name: 'Ledger' })).toHaveAccessibleDescription(
      'Done: every value stated has a source',
    );
    expect(within(list).getByText('A').getAttribute('style')).not.toContain('background-color');
    expect(within(list).getByText('B').getAttribute('style')).toContain('background-color');
  });
});
