import { Button, makeStyles, Radio, RadioGroup, tokens } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import type { OptionView } from '@steelyard/api/contract/design-sets';
import { type Ruling as Given, rulingSchema } from '@steelyard/calc';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { useChange } from '../../../shared/api/use-change';
import { DialogBox } from '../../../shared/ui/dialog-box';
import { Form } from '../../../shared/ui/form';
import { Moment } from '../../../shared/ui/moment';
import { TextAreaField } from '../../../shared/ui/text-area-field';
import { dropValues, keptValues, useKeptValues } from '../../../shared/ui/use-kept-values';
import { Word } from '../../../shared/ui/words';
import { sessionQuery } from '../../access/api/access';
import { ruleOnOption } from '../api/options';

const useStyles = makeStyles({
  ruling: {
    display: 'grid',
    justifyItems: 'start',
    gap: '4px',
    marginBottom: '12px',
    overflowWrap: 'anywhere',
  },
  line: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '6px 8px' },
  note: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  actions: { display: 'flex', justifyContent: 'flex-end', gap: '8px' },
});

const kinds: Record<Given['kind'], string> = {
  admissible: 'Admissible',
  conditions: 'Admissible, with conditions',
  'not-admissible': 'Not admissible',
};

interface RulingProps {
  studyId: string;
  option: OptionView;
  /** The methodologist rules; others read it. */
  mayRule: boolean;
}

/** Whether the option may be chosen, and why. */
export function Ruling({ studyId, option, mayRule }: RulingProps) {
  const styles = useStyles();
  const [editing, setEditing] = useState(false);
  const { ruling } = option;
  return (
    <div className={styles.ruling}>
      <div className={styles.line}>
        <Word is="ruling" chip>
          {ruling ? kinds[ruling.kind] : 'No ruling yet'}
        </Word>
        {mayRule && (
          <Button size="small" onClick={() => setEditing(true)}>
            {ruling ? 'Change the ruling' : 'Rule on it'}
          </Button>
        )}
      </div>
      {ruling && (
        <p className={styles.note}>
          {ruling.reason} {ruling.by}, <Moment iso={ruling.at} />
        </p>
      )}
      {editing && <RulingDialog studyId={studyId} option={option} onClose={() => setEditing(false)} />}
    </div>
  );
}

function RulingDialog(props: { studyId: string; option: OptionView; onClose: () => void }) {
  const styles = useStyles();
  const { studyId, option, onClose } = props;
  const { change, fault, stale, busy } = useChange(studyId);
  const key = `steelyard-ruling/${useQuery(sessionQuery()).data?.id}/${option.id}`;
  const form = useForm<Given>({
    defaultValues: keptValues<Given>(key) ?? {
      kind: option.ruling?.kind ?? 'admissible',
      reason: option.ruling?.reason ?? '',
    },
    resolver: zodResolver(rulingSchema),
  });
  useKeptValues(form, key);
  const { control, handleSubmit } = form;
  const now = option.ruling ? `${kinds[option.ruling.kind]}: ${option.ruling.reason}` : 'No ruling';
  return (
    <DialogBox title={`Ruling on ${option.name}`} onClose={onClose}>
      {(close) => (
        <Form
          label="Ruling"
          fault={stale ? `${fault} Now: ${now} Rule again to put yours in its place, or cancel.` : fault}
          onSubmit={() =>
            void handleSubmit(async (given) => {
              const body = { ...given, version: option.version };
              if (!(await change(() => ruleOnOption(studyId, option.id, body)))) return;
              dropValues(key);
              close();
            })()
          }
        >
          <Controller
            control={control}
            name="kind"
            render={({ field }) => (
              <RadioGroup
                aria-label="Ruling"
                value={field.value}
                onChange={(_, { value }) => field.onChange(value)}
              >
                {Object.entries(kinds).map(([value, label]) => (
                  <Radio key={value} value={value} label={label} />
                ))}
              </RadioGroup>
            )}
          />
          <TextAreaField
            label="Reason"
            hint="Whoever reads the ruling later must be able to follow it."
            rows={3}
            control={control}
            name="reason"
          />
          <div className={styles.actions}>
            <Button
              onClick={() => {
                dropValues(key);
                close();
              }}
            >
              Cancel
            </Button>
            <Button type="submit" appearance="primary" disabledFocusable={busy}>
              Rule
            </Button>
          </div>
        </Form>
      )}
    </DialogBox>
  );
}
