import { Button } from '@fluentui/react-components';
import { type ReactNode, Suspense, useEffect, useRef, useState } from 'react';
import { lazily } from '../../../shared/ui/lazily';
import { OptionBar } from '../../weigh/components/option-bar';
import { OptionDetails } from '../../weigh/components/option-details';
import type { Weighed, Weighing } from '../../weigh/model/weighing';

const OptionForm = lazily(async () => (await import('./option-form')).OptionForm);

interface OptionEditingProps {
  option: Weighed;
  weighing: Weighing;
  /** Where the option can be looked at from here. */
  looks: ReactNode;
  /** What may be done with the option as a whole. */
  actions: ReactNode;
}

/** An option to read and, once that is asked for or was begun, its form in the same place. */
export function OptionEditing({ option, weighing, looks, actions }: OptionEditingProps) {
  const begun = option.draft !== undefined;
  const [editing, setEditing] = useState<'begun' | 'asked' | 'done'>(begun ? 'begun' : 'done');
  const edit = useRef<HTMLButtonElement>(null);
  const wasEditing = useRef(false);

  useEffect(() => {
    if (editing !== 'done') wasEditing.current = true;
    else if (wasEditing.current) edit.current?.focus();
  }, [editing]);

  const reading = (
    <>
      <OptionDetails option={option} weighing={weighing} actions={actions} />
      <OptionBar looks={looks} told={begun && 'Edits not saved'}>
        <Button
          ref={edit}
          appearance="primary"
          aria-busy={editing !== 'done'}
          onPointerEnter={OptionForm.sendFor}
          onFocus={OptionForm.sendFor}
          onClick={() => setEditing('asked')}
        >
          Edit
        </Button>
      </OptionBar>
    </>
  );
  if (editing === 'done') return reading;
  return (
    <Suspense fallback={reading}>
      <OptionForm
        option={option}
        weighing={weighing}
        looks={looks}
        actions={actions}
        focused={editing === 'asked'}
        onDone={() => setEditing('done')}
      />
    </Suspense>
  );
}
