import type { ReactNode } from 'react';
import { OptionTag } from '../../../shared/ui/option-tag';
import { Sheet } from '../../../shared/ui/sheet';
import type { Weighed, Weighing } from '../model/weighing';
import { ToldAgainst } from './told-against';

interface OptionSheetProps {
  option: Weighed;
  weighing: Weighing;
  /** What stands before the figures: the ruling. */
  ruling: ReactNode;
  /** All that is known of the option, to read or to edit. */
  details: ReactNode;
  onClose: () => void;
}

/** The chosen option over the whole of a small screen. */
export function OptionSheet({ option, weighing, ruling, details, onClose }: OptionSheetProps) {
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
      <ToldAgainst option={option} weighing={weighing} />
      {details}
    </Sheet>
  );
}
