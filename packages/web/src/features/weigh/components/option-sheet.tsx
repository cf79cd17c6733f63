import { makeStyles } from '@fluentui/react-components';
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
  onClose: () => void;
}

/** The chosen option over the whole of a small screen. */
export function OptionSheet({ option, weighing, workingHref, onClose }: OptionSheetProps) {
  const styles = useStyles();
  const title = (
    <>
      <OptionTag letter={option.letter} position={option.position} />
      <span>{option.name}</span>
    </>
  );
  return (
    <Sheet title={title} onClose={onClose}>
      <OptionDetails option={option} weighing={weighing} />
      <div className={styles.links}>
        <ButtonLink to={workingHref}>Working</ButtonLink>
      </div>
    </Sheet>
  );
}
