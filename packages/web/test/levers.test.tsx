import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { stillfoot } from './fixtures/stillfoot';
import { addsOptions, openWeigh, optionRows } from './weigh-page';

const levers = async () =>
  within(
    (await screen.findByRole('heading', { name: /^Levers: fewer participants/ })).closest(
      'section',
    ) as HTMLElement,
  );

describe('The levers of an option', () => {
  it('say what each saves and its price', async () => {
    await openWeigh(stillfoot());
    const [crossover, baseline] = (await levers()).getAllByRole('listitem');
    // Recruited 214 in parallel arms, 150 adjusted for the baseline, 50 in the crossover: computed in R.
    expect(crossover).toHaveTextContent(
      /^Give everyone both treatments, in either order164 fewer157 k€ less/,
    );
    expect(baseline).toHaveTextContent(
      /Adjust for a baseline measurement64 fewer44 k€ less, 9\.7 months shorter/,
    );
    expect(baseline).toHaveTextContent('1 more measurement each');
  });

  it('make an option of their own when tried', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    const sent = addsOptions(fixture);
    const found = await levers();
    await user.click(
      found.getByRole('button', { name: 'Try as an option: Adjust for a baseline measurement' }),
    );
    await waitFor(() => expect(optionRows()).toHaveLength(5));
    expect(sent).toEqual([
      {
        name: 'Parallel, unadjusted: adjust for a baseline measurement',
        plan: {
          family: 'parallel',
          treatments: [0, 1],
          structure: {},
          repeated: { baselines: 1, followUps: 1 },
          overrides: {},
        },
      },
    ]);
    expect(address()).toContain(fixture.designSet.options[3]?.id);
  });

  it('are read and not pulled by a reader', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    await openWeigh(fixture);
    expect((await levers()).getAllByRole('listitem').length).toBeGreaterThan(1);
    expect((await levers()).queryByRole('button', { name: /^Try as an option/ })).toBeNull();
  });
});
