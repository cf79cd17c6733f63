import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { type LeverOffer, leversOf } from '@steelyard/calc';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useDeferredValue, useMemo } from 'react';
import { useChange } from '../../../shared/api/use-change';
import { count, percent } from '../../../shared/format/numbers';
import { ownTokens } from '../../../shared/ui/own-tokens';
import { TitledSection } from '../../../shared/ui/titled-section';
import { Word } from '../../../shared/ui/words';
import { addOption } from '../../options/api/options';
import { freeName } from '../../options/model/free-name';
import { costsQuery } from '../../studies/api/studies';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { priceWords } from '../model/lever-words';

const useStyles = makeStyles({
  levers: { display: 'grid', gap: '8px' },
  lever: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto',
    gap: '2px 10px',
    padding: '8px 10px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: '8px',
    overflowWrap: 'anywhere',
  },
  saving: { color: ownTokens.fits, fontWeight: 700, whiteSpace: 'nowrap' },
  price: {
    gridColumn: '1 / -1',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
  act: { gridColumn: '1 / -1', justifySelf: 'start', '@media print': { display: 'none' } },
  fault: { color: tokens.colorStatusDangerForeground1 },
});

interface LeversProps {
  option: Weighed;
  weighing: Weighing;
  level?: 2 | 3;
  /** Shows the option that a lever made; without it levers are read and not pulled. */
  onTried?: ((optionId: string) => void) | undefined;
}

/** What would cut the option's participants, each with its price. */
export function Levers({ option, weighing, level = 3, onTried }: LeversProps) {
  const styles = useStyles();
  const { study, ledger, hold, options, currency } = weighing;
  const { data: costs } = useSuspenseQuery(costsQuery(study.id));
  const { plan, words } = option;
  // Dragging and typing come first: a lever takes a search for each of its changes.
  const asked = useDeferredValue(plan);
  const offers = useMemo(
    () => leversOf({ question: study.plan, ledger, costs, hold }, asked, words),
    [study.plan, ledger, costs, hold, asked, words],
  );
  const { change, fault, busy } = useChange(study.id);
  const tryOut = ({ label, plan: changed }: LeverOffer) =>
    change(async () => {
      const name = freeName(
        `${option.name}: ${label.charAt(0).toLocaleLowerCase('en-GB')}${label.slice(1)}`,
        options.map((each) => each.name),
      );
      onTried?.((await addOption(study.id, { name, plan: changed })).id);
    });
  if (offers.length === 0) return null;
  return (
    <TitledSection
      level={level}
      title={
        <>
          <Word is="lever">Levers</Word>: fewer {words.participants.many}
          {hold.kind !== 'power' && ` at power ${percent(hold.power)}`}, at what price
        </>
      }
    >
      <ul className={styles.levers}>
        {offers.map((offer) => {
          const figures = priceWords(offer, { currency, clusters: words.clusters });
          return (
            <li key={offer.label} className={styles.lever}>
              <span>{offer.label}</span>
              <span className={styles.saving}>{`${count(offer.saving)} fewer`}</span>
              <span className={styles.price}>{figures ? `${figures}; ${offer.price}` : offer.price}</span>
              {onTried && (
                <Button
                  size="small"
                  className={styles.act}
                  disabledFocusable={busy}
                  aria-label={`Try as an option: ${offer.label}`}
                  onClick={() => void tryOut(offer)}
                >
                  Try as an option
                </Button>
              )}
            </li>
          );
        })}
      </ul>
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </TitledSection>
  );
}
