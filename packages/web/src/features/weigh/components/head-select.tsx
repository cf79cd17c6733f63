import { makeStyles, tokens } from '@fluentui/react-components';
import { narrow } from './row-styles';

const useStyles = makeStyles({
  select: {
    maxWidth: '100%',
    [narrow]: { maxWidth: 'none' },
    margin: 0,
    padding: '2px 20px 2px 6px',
    marginLeft: '-7px',
    border: '1px solid transparent',
    borderRadius: '5px',
    appearance: 'none',
    backgroundColor: 'transparent',
    // A chevron of two gradients: an image would have to be drawn for each theme.
    backgroundImage:
      'linear-gradient(45deg, transparent 50%, currentColor 50%), linear-gradient(135deg, currentColor 50%, transparent 50%)',
    backgroundPosition: 'right 10px top 55%, right 6px top 55%',
    backgroundSize: '4px 5px',
    backgroundRepeat: 'no-repeat',
    color: tokens.colorNeutralForeground1,
    font: 'inherit',
    fontWeight: 700,
    textOverflow: 'ellipsis',
    cursor: 'pointer',
    fieldSizing: 'content',
    ':hover': { border: `1px solid ${tokens.colorNeutralStroke1}` },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-1px' },
    '& option': { backgroundColor: tokens.colorNeutralBackground1, color: tokens.colorNeutralForeground1 },
    '@media print': { paddingRight: 0, backgroundImage: 'none' },
  },
});

interface HeadSelectProps<Value extends string> {
  label: string;
  value: Value;
  choices: readonly { value: Value; label: string }[];
  onChoose: (value: Value) => void;
}

/** A column's head that says what the column shows and offers what else it could show. */
export function HeadSelect<Value extends string>(props: HeadSelectProps<Value>) {
  const styles = useStyles();
  return (
    <select
      aria-label={props.label}
      value={props.value}
      className={styles.select}
      onChange={({ target }) => props.onChoose(target.value as Value)}
    >
      {props.choices.map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))}
    </select>
  );
}
