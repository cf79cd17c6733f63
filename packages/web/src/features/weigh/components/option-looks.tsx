import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { ButtonLink } from '../../../shared/ui/text-link';
import { counterpartOf, referenceOf } from '../model/against';
import type { Weighed, Weighing } from '../model/weighing';
import { useWeighView } from './use-weigh-view';

const useStyles = makeStyles({
  against: { minWidth: 0, fontWeight: 400 },
  pressed: {
    border: `1px solid ${tokens.colorBrandForeground1}`,
    backgroundColor: ownTokens.brassSoft,
    fontWeight: 700,
    ':hover': { border: `1px solid ${tokens.colorBrandForeground1}`, backgroundColor: ownTokens.brassSoft },
  },
});

interface OptionLooksProps {
  option: Weighed;
  weighing: Weighing;
  workingHref: string;
}

/** From an option to its working, and to how all options differ from another one. */
export function OptionLooks({ option, weighing, workingHref }: OptionLooksProps) {
  const styles = useStyles();
  const { view, show } = useWeighView();
  const inForce = referenceOf(weighing, view.against);
  const other = counterpartOf(option, weighing, inForce);
  const pressed = other !== undefined && other.id === inForce?.id;
  return (
    <>
      <ButtonLink to={workingHref}>Working</ButtonLink>
      {other && (
        <Button
          className={mergeClasses(styles.against, pressed && styles.pressed)}
          aria-pressed={pressed}
          onClick={() => show({ against: pressed ? undefined : other.id })}
        >
          Against {other.letter}
        </Button>
      )}
    </>
  );
}
