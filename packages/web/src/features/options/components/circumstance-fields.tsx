import { Field, makeStyles, Radio, RadioGroup } from '@fluentui/react-components';
import { type Circumstances, circumstanceQuestions } from '../../designs/model/circumstances';

const useStyles = makeStyles({
  questions: { display: 'grid', gap: '10px' },
  answers: { flexWrap: 'wrap' },
});

interface CircumstanceFieldsProps {
  known: Circumstances;
  onChange: (known: Circumstances) => void;
}

const answers = { yes: true, no: false, open: undefined };
const answerOf = (said: boolean | undefined) => (said === undefined ? 'open' : said ? 'yes' : 'no');

/** What the question allows, asked before any design is. */
export function CircumstanceFields({ known, onChange }: CircumstanceFieldsProps) {
  const styles = useStyles();
  return (
    <div className={styles.questions}>
      {Object.entries(circumstanceQuestions).map(([key, { asks, says }]) => (
        <Field key={key} label={asks} hint={says}>
          <RadioGroup
            layout="horizontal"
            className={styles.answers}
            value={answerOf(known[key as keyof Circumstances])}
            onChange={(_, { value }) => onChange({ ...known, [key]: answers[value as keyof typeof answers] })}
          >
            <Radio value="yes" label="Yes" />
            <Radio value="no" label="No" />
            <Radio value="open" label="Not known" />
          </RadioGroup>
        </Field>
      ))}
    </div>
  );
}
