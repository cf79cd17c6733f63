import { Button, Field, Input, makeStyles, tokens } from '@fluentui/react-components';
import { useEffect, useRef, useState } from 'react';
import { useController } from 'react-hook-form';
import { lettersOf, presetsFor } from '../families/crossover-sequences';
import { listMessage } from './list-error';
import { type PartProps, structurePath } from './structure-props';

const useStyles = makeStyles({
  presets: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: '6px',
    padding: 0,
    margin: 0,
    border: 'none',
    minWidth: 0,
  },
  preset: { minWidth: 0, fontWeight: 400, whiteSpace: 'normal' },
  letters: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

const textOf = (sequences: unknown): string => (Array.isArray(sequences) ? sequences.join(', ') : '');
const sequencesIn = (text: string): string[] =>
  text
    .toUpperCase()
    .split(/[\s,;/]+/)
    .filter(Boolean);

/** A crossover's sequences: the usual sets to take, and their names to type. */
export function SequencesField({ form, words: { arms } }: PartProps<'sequences'>) {
  const styles = useStyles();
  const { field, fieldState } = useController({ control: form.control, name: structurePath('sequences') });
  const named = textOf(field.value);
  const [text, setText] = useState(named);
  const typed = useRef(named);
  const letters = lettersOf(arms.length);

  // After a reset, or a set that was taken, what was typed no longer stands for it.
  useEffect(() => {
    if (named === typed.current) return;
    typed.current = named;
    setText(named);
  }, [named]);

  const take = (sequences: readonly string[]) => field.onChange([...sequences]);
  const read = (next: string) => {
    typed.current = textOf(sequencesIn(next));
    setText(next);
    take(sequencesIn(next));
  };

  return (
    <>
      <Field
        label="Sequences"
        hint="One letter a period, such as AB, BA; equally many take each."
        validationState={fieldState.error ? 'error' : 'none'}
        validationMessage={listMessage(fieldState.error)}
      >
        <Input
          name={field.name}
          ref={field.ref}
          value={text}
          autoComplete="off"
          spellCheck={false}
          onChange={(_, { value }) => read(value)}
          onBlur={() => {
            field.onBlur();
            setText(named);
          }}
        />
      </Field>
      <p className={styles.letters}>
        {letters.map((letter, arm) => `${letter} is ${arms[arm]}`).join(', ')}.
      </p>
      <fieldset className={styles.presets} aria-label="Usual sequences">
        {presetsFor(arms.length).map(({ name, sequences }) => (
          <Button
            key={name}
            size="small"
            className={styles.preset}
            aria-label={`${name}: ${sequences.join(', ')}`}
            aria-pressed={textOf(sequences) === named}
            onClick={() => take(sequences)}
          >
            {sequences.length > 4 ? name : sequences.join(' / ')}
          </Button>
        ))}
      </fieldset>
    </>
  );
}
