import { zodResolver } from '@hookform/resolvers/zod';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useForm } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { NumberField, type NumberFieldProps } from '../src/shared/ui/number-field';
import { valueOfExpression } from '../src/shared/ui/number-field-expression';
import { bareText, type NumberKind, plainValue, stepped, textOf } from '../src/shared/ui/number-field-text';

type Values = { value: number | undefined };

const anyNumber = z.number().or(z.undefined());

function Example(
  props: Partial<NumberFieldProps<Values>> & {
    schema?: z.ZodType<number | undefined, number | undefined>;
    start?: number | string;
  },
) {
  const { schema = anyNumber, start, ...rest } = props;
  const form = useForm<Values>({
    defaultValues: { value: start as number },
    resolver: zodResolver(z.object({ value: schema })),
    mode: 'onChange',
  });
  return (
    <form>
      <NumberField label="Loss" control={form.control} name="value" {...rest} />
      <output>{String(form.watch('value'))}</output>
      <button type="button" onClick={() => form.reset({ value: 0.5 })}>
        Reset
      </button>
    </form>
  );
}

const field = () => screen.getByRole('textbox', { name: 'Loss' });
const keptValue = () => screen.getByRole('status').textContent;

function show(props: Parameters<typeof Example>[0]) {
  render(<Example {...props} />);
  return userEvent.setup();
}

const read = (text: string, kind: NumberKind, unit = '') => plainValue(bareText(text, kind, unit), kind);

describe('Text for numbers', () => {
  it.each<[string, NumberKind, number]>([
    ['12.5', 'number', 12.5],
    ['12,5', 'number', 12.5],
    ['−3', 'number', -3],
    ['.04', 'number', 0.04],
    ['1e-3', 'number', 0.001],
    ['12', 'percent', 0.12],
    ['7,5', 'percent', 0.075],
    ['1,760', 'whole', 1760],
    ['490.000', 'money', 490000],
    ['1,234,567.50', 'money', 1234567.5],
    ['239 000', 'money', 239000],
    ['12,50', 'money', 12.5],
  ])('reads “%s” in a %s field as %d', (text, kind, value) => {
    expect(read(text, kind)).toBe(value);
  });

  it('does without the unit behind a number', () => {
    expect(read('12 %', 'percent', '%')).toBe(0.12);
    expect(read('13 g/L', 'number', 'g/L')).toBe(13);
  });

  it.each(['twelve', '1.2.3', '12 g', '-', '√3'])('takes “%s” for no plain number', (text) => {
    expect(read(text, 'number')).toBeUndefined();
  });

  it.each<[number, NumberKind, string]>([
    [0.07, 'percent', '7'],
    [0.125, 'percent', '12.5'],
    [800000, 'money', '800,000'],
    [1760, 'whole', '1,760'],
    [0.04, 'number', '0.04'],
  ])('shows %d in a %s field as %s', (value, kind, text) => {
    expect(textOf(value, kind)).toBe(text);
  });

  it('steps by the last decimal shown, and by a round sum for money', () => {
    expect(stepped(0.04, 'number', 1)).toBe(0.05);
    expect(stepped(2.1, 'number', -1)).toBe(2);
    expect(stepped(0.12, 'percent', 1)).toBe(0.13);
    expect(stepped(44, 'whole', -1)).toBe(43);
    expect(stepped(800000, 'money', 1)).toBe(810000);
  });
});

describe('Expressions', () => {
  it.each([
    ['√3', 1.7320508075688772],
    ['√(2)', Math.SQRT2],
    ['12/0.88', 13.636363636363637],
    ['2×(3+4)', 14],
    ['2^(1/2)', Math.SQRT2],
    ['-3+1', -2],
    ['exp(0)', 1],
  ])('works “%s” out', (text, value) => {
    expect(valueOfExpression(text)).toBeCloseTo(value, 12);
  });

  it.each(['1/0', 'twelve', 'import("x")', '2+', 'a=3', '[1,2]', 'sqrt(-1)', '"2"+1'])(
    'makes nothing of “%s”',
    (text) => {
      expect(valueOfExpression(text)).toBeNaN();
    },
  );
});

describe('The number field', () => {
  it('shows percent and keeps proportions', async () => {
    const user = show({ kind: 'percent', start: 0.12 });
    expect(field()).toHaveValue('12');
    expect(field()).toHaveAccessibleDescription('%');
    await user.clear(field());
    await user.type(field(), '7,5');
    expect(keptValue()).toBe('0.075');
    await user.tab();
    expect(field()).toHaveValue('7.5');
  });

  it('says a bound in the unit shown', async () => {
    const schema = z.number().max(0.9, 'The loss must be 0.9 or less.');
    const user = show({ kind: 'percent', start: 0.12, schema });
    await user.clear(field());
    await user.type(field(), '95');
    expect(await screen.findByText('The loss must be 90 % or less.')).toBeVisible();
    expect(field()).toBeInvalid();
  });

  it('says so when text is no number, and keeps the text', async () => {
    const user = show({ start: 3 });
    await user.clear(field());
    await user.type(field(), 'twelve');
    await user.tab();
    expect(await screen.findByText(/“twelve” is not a number/)).toBeVisible();
    expect(field()).toBeInvalid();
    expect(field()).toHaveValue('twelve');
    expect(keptValue()).toBe('twelve');
  });

  it('shows text that was kept and is no number again, and says so', async () => {
    const user = show({ start: 'twelve', kind: 'percent' });
    expect(field()).toHaveValue('twelve');
    expect(screen.getByText(/“twelve” is not a number/)).toBeVisible();
    await user.clear(field());
    await user.type(field(), '12');
    expect(field()).toBeValid();
    expect(keptValue()).toBe('0.12');
  });

  it('works an expression out, says what it comes to and keeps it as typed', async () => {
    const user = show({ unit: 'to 1' });
    await user.type(field(), '√3');
    expect(await screen.findByText('= 1.7321 to 1')).toBeVisible();
    await user.tab();
    expect(field()).toHaveValue('√3');
    expect(field()).toBeValid();
    expect(Number(keptValue())).toBeCloseTo(1.7320508075688772, 14);
  });

  it('can be emptied', async () => {
    const user = show({ start: 3 });
    await user.clear(field());
    await user.tab();
    expect(field()).toHaveValue('');
    expect(keptValue()).toBe('undefined');
  });

  it('stays empty after the form has complained of it', async () => {
    const user = show({ start: 3, schema: z.number({ error: 'State the loss.' }) });
    await user.clear(field());
    expect(await screen.findByText('State the loss.')).toBeVisible();
    expect(field()).toHaveValue('');
    await user.type(field(), '4');
    expect(keptValue()).toBe('4');
    expect(field()).toHaveValue('4');
  });

  it('steps with the arrow keys', async () => {
    const user = show({ kind: 'whole', start: 40 });
    await user.type(field(), '{ArrowUp}{ArrowUp}{ArrowDown}');
    expect(field()).toHaveValue('41');
    expect(keptValue()).toBe('41');
  });

  it('follows the form when it is reset', async () => {
    const user = show({ kind: 'percent', start: 0.12 });
    await user.clear(field());
    await user.type(field(), 'many');
    await user.click(screen.getByRole('button', { name: 'Reset' }));
    await waitFor(() => expect(field()).toHaveValue('50'));
    expect(field()).toBeValid();
  });
});
