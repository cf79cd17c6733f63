import { makeStyles, tokens } from '@fluentui/react-components';
import { type AppraisalRequest, explain } from '@steelyard/calc';
import type { ReactNode } from 'react';
import { OptionTag } from '../../../shared/ui/option-tag';
import { optionHue } from '../../../shared/ui/own-tokens';
import { TextLink } from '../../../shared/ui/text-link';
import { TitledSection } from '../../../shared/ui/titled-section';
import { Word } from '../../../shared/ui/words';
import { StructureFacts } from '../../designs/components/structure-facts';
import { familyUiOf } from '../../designs/families/registry';
import { Levers } from '../../levers/components/levers';
import { Cautions } from '../../weigh/components/cautions';
import { OutOfReach } from '../../weigh/components/out-of-reach';
import { assumptionsOf } from '../../weigh/model/assumptions';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import { symbolsOf } from '../model/symbols';
import { AssumptionsTable } from './assumptions-table';
import { ComparisonsTable } from './comparisons-table';
import { RequestJson } from './request-json';
import { ScheduleTable } from './schedule-table';
import { Steps } from './steps';
import { Symbols } from './symbols';

const useStyles = makeStyles({
  page: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr)',
    gap: '20px',
    maxWidth: '1120px',
    '@media (min-width: 1760px)': { maxWidth: '1480px', paddingInline: '28px' },
    padding: '16px 18px 40px',
    '@media (max-width: 640px)': { padding: '12px' },
  },
  heading: { display: 'flex', gap: '12px', alignItems: 'flex-start' },
  name: {
    minWidth: 0,
    fontSize: '19px',
    lineHeight: '26px',
    fontWeight: 700,
    overflowWrap: 'anywhere',
  },
  sub: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '20px' },
  structure: { maxWidth: '560px', marginTop: '12px', overflowWrap: 'anywhere' },
  trouble: {
    marginTop: '10px',
    padding: '10px 14px',
    borderRadius: '8px',
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
  },
});

interface WorkingProps {
  option: Weighed;
  weighing: Weighing;
  weighHref: string;
  /** Which version it is the working of, where there are two. */
  version: ReactNode;
}

/** How one option's figures come about, step by step, and what they rest on. */
export function Working({ option, weighing, weighHref, version }: WorkingProps) {
  const styles = useStyles();
  const { family, plan, words, appraisal, error, request, letter, position, name } = option;
  const { study, ledger } = weighing;
  const face = familyUiOf(family);
  const size = appraisal?.feasible ? appraisal : null;
  return (
    <div className={styles.page}>
      <div>
        <div className={styles.heading}>
          <OptionTag
            letter={letter}
            position={position}
            outlined={option.ruling?.kind === 'not-admissible'}
          />
          <h1 className={styles.name}>{name}: the working</h1>
        </div>
        <p className={styles.sub}>
          {face.summary(plan, size, words)} · <TextLink to={weighHref}>beside the other options</TextLink>
        </p>
        {version}
        {!size && (
          <div className={styles.trouble}>
            <OutOfReach option={option} />
          </div>
        )}
      </div>
      <TitledSection level={2} title="Schedule">
        <ScheduleTable schematic={face.schematic(plan, words)} arms={words.arms} hue={optionHue(position)} />
        <div className={styles.structure}>
          <StructureFacts plan={plan} />
        </div>
      </TitledSection>
      {request && !error && (
        <TitledSection level={2} title="Step by step">
          <Steps steps={explain(request as AppraisalRequest)} arms={words.arms} />
          <Symbols symbols={symbolsOf(request as AppraisalRequest)} />
        </TitledSection>
      )}
      <TitledSection
        level={2}
        title={
          <>
            <Word is="planningValue">Planning values</Word> it rests on
          </>
        }
      >
        <AssumptionsTable assumptions={assumptionsOf(option, ledger, study.outcomeUnit)} />
      </TitledSection>
      {size && size.comparisons.length > 1 && (
        <TitledSection level={2} title="Comparisons">
          <ComparisonsTable size={size} arms={words.arms} />
        </TitledSection>
      )}
      <Levers option={option} weighing={weighing} level={2} />
      {appraisal && (
        <TitledSection level={2} title="Cautions">
          <Cautions cautions={appraisal.cautions} />
        </TitledSection>
      )}
      {request && <RequestJson request={request} />}
    </div>
  );
}
