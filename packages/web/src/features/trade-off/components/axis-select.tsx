import { makeStyles, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  label: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '6px',
    minWidth: 0,
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
  },
  select: {
    minWidth: 0,
    maxWidth: '210px',
    fieldSizing: 'content',
    height: '26px',
    padding: '0 8px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '999px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    font: 'inherit',
    textOverflow: 'ellipsis',
    cursor: 'pointer',
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '1px' },
    '@media (max-width: 640px)': { height: '32px', maxWidth: '36vw' },
  },
});

interface AxisSelectProps<Kind extends string> {
  label: string;
  value: Kind;
  choices: readonly { kind: Kind; label: string }[];
  onChange: (kind: Kind) => void;
}

/** What an axis shows, chosen from what is known. */
export function AxisSelect<Kind extends string>({ label, value, choices, onChange }: AxisSelectProps<Kind>) {
  const styles = useStyles();
  return (
    <label className={styles.label}>
      {label}
      <select
        className={styles.select}
        value={value}
        onChange={({ target }) => {
          const chosen = choices.find(({ kind }) => kind === target.value);
          if (chosen) onChange(chosen.kind);
        }}
      >
        {choices.map(({ kind, label: name }) => (
          <option key={kind} value={kind}>
            {name}
          </option>
        ))}
      </select>
    </label>
  );
}
