import { FluentProvider, webLightTheme } from '@fluentui/react-components';
import { render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { OutOfReach } from '../src/features/weigh/components/out-of-reach';
import { weighingOf } from '../src/features/weigh/model/weighing';
import { greenkettle } from './fixtures/greenkettle';

it('An option that cannot reach the power says so, with the power it is limited to and what would do', () => {
  const [option] = weighingOf({ ...greenkettle(), draftOf: () => undefined }).options;
  if (!option) throw new Error('no option');
  const infeasible = {
    code: 'clusters',
    message: 'No size suffices.',
    limitingPower: 0.726,
    fewestUnits: 22,
  } as const;
  render(
    <FluentProvider theme={webLightTheme}>
      <OutOfReach option={{ ...option, appraisal: { feasible: false, infeasible, cautions: [] } }} />
    </FluentProvider>,
  );
  expect(screen.getByText('Cannot reach the power.')).toBeVisible();
  expect(screen.getByText(/No size suffices\./)).toBeVisible();
  expect(screen.getByText('Limiting power 72.6 %. Catchments in each arm that would do: 22.')).toBeVisible();
});
