import { screen, waitFor, within } from '@testing-library/react';
import { expect } from 'vitest';
import { option, type StudyFixture } from './fixtures/study-fixture';
import { openWeigh, storesOptions } from './weigh-page';

export const form = () => within(screen.getByRole('form', { name: 'Option' }));

/** The message at a field, as it is announced. */
export const complaint = () => form().findByRole('alert');

/** A study's Weigh with one option, whose form is open; what is saved is collected. */
export async function openForm(fixture: StudyFixture, plan: Parameters<typeof option>[1]) {
  fixture.designSet.options = [option('The option', plan)];
  const { user } = await openWeigh(fixture);
  await user.click(screen.getByRole('button', { name: 'Edit' }));
  await screen.findByRole('form', { name: 'Option' });
  const sent = storesOptions(fixture);
  return {
    user,
    fill: async (label: string, text: string) => {
      await user.clear(form().getByLabelText(label));
      if (text) await user.type(form().getByLabelText(label), text);
    },
    /** What is stored on Save. */
    saved: async () => {
      const before = sent.length;
      await user.click(form().getByRole('button', { name: 'Save' }));
      await waitFor(() => expect(sent.length).toBe(before + 1));
      return sent.at(-1)?.plan;
    },
    sent,
  };
}
