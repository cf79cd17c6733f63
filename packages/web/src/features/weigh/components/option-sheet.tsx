import { makeStyles } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { OptionTag } from '../../../shared/ui/option-tag';
import { Sheet } from '../../../shared/ui/sheet';
import { ButtonLink } from '../../../shared/ui/text-link';
import type { Weighed, Weighing } from '../model/weighing';
import { OptionDetails } from './option-details';

const useStyles = makeStyles({ links: { marginTop: '16px' } });

interface OptionSheetProps {
  option: Weighed;
  weighing: Weighing;
  workingHref: string;
  /** What stands before the figures: the ruling. */
  ruling: ReactNode;
  form: ReactNode;
  /** What may be done with the option as a whole. */
  actions: ReactNode;
  onClose: () => void;
}

/** The chosen option over the whole of a small screen. */
export function OptionSheet({
  option,
  weighing,
  workingHref,
  ruling,
  form,
  actions,
  onClose,
}: OptionSheetProps) {
  const styles = useStyles();
  const title = (
    <>
      <OptionTag
        letter={option.letter}
        position={option.position}
        outlined={option.ruling?.kind === 'not-admissible'}
      />
      <span>{option.name}</span>
    </>
  );
  return (
    <Sheet title={title} onClose={onClose}>
      {ruling}
      <OptionDetails option={option} weighing={weighing} form={form} />
      <div className={styles.links}>
        <ButtonLink to={workingHref}>Working</ButtonLink>
        {actions}
      </div>
    </Sheet>
  );
}
