import { makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import type { QuestionOutcome } from '@steelyard/calc';
import type { ReactNode } from 'react';
import { capitalised } from '../../../shared/format/lists';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { type Fact, Facts } from '../../../shared/ui/facts';
import { TitledSection } from '../../../shared/ui/titled-section';
import { marginInWords, points } from '../model/margin-words';
import { betterWords, kindWords } from '../model/outcome-values';
import { basisWords, strategyWords } from '../model/question-form';

const useStyles = makeStyles({
  parts: { display: 'grid', gap: '14px', maxWidth: '720px' },
  question: { fontSize: '17px', lineHeight: '24px', overflowWrap: 'anywhere' },
  text: { display: 'grid', gap: '8px', overflowWrap: 'anywhere' },
  name: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
});

/** A study’s question for those who read it. */
export function QuestionFacts({ study }: { study: StudyView }) {
  const styles = useStyles();
  const { outcome, test } = study.plan;
  const { basis, estimand, clusters, participants } = study;
  return (
    <div className={styles.parts}>
      <p className={styles.question}>{study.question}</p>
      <Part title="Outcome, target difference and test">
        <Facts facts={[...outcomeFacts(study), ...testFacts(study)]} />
        <p>{test.sides === 2 ? 'The test is two-sided.' : 'The test is one-sided.'}</p>
        {outcome.better && <p>{`${betterWords[outcome.kind][outcome.better]} is better.`}</p>}
      </Part>
      <Part title="Basis of the target difference">
        {basis ? (
          <Texts
            texts={[
              ['Why this difference', basisWords[basis.kind]],
              ['To whom', basis.toWhom],
              ['Because', basis.why],
            ]}
          />
        ) : (
          <p>The team has not said it yet.</p>
        )}
      </Part>
      <Part title="Estimand, by the attributes of ICH E9(R1)">
        {estimand ? (
          <Texts
            texts={[
              ['Treatment', estimand.treatment],
              ['Population', estimand.population],
              ['Variable', estimand.variable],
              ...estimand.intercurrentEvents.map(({ event, strategy }): [string, string] => [
                `Intercurrent event: ${event}`,
                strategyWords[strategy],
              ]),
              ['Population-level summary', estimand.summary],
            ]}
          />
        ) : (
          <p>The team has not said it yet.</p>
        )}
      </Part>
      <Part title="Treatments and words">
        <Facts
          facts={[
            ...study.treatments.map(({ name }, place) => ({
              name:
                place === 0 ? 'Control' : `Active treatment${study.treatments.length > 2 ? ` ${place}` : ''}`,
              value: name,
            })),
            { name: 'Participants', value: participants.many },
            ...(clusters ? [{ name: 'Clusters', value: clusters.many }] : []),
          ]}
        />
      </Part>
    </div>
  );
}

function outcomeFacts({ plan: { outcome, test }, outcomeLabel, outcomeUnit }: StudyView): Fact[] {
  return [
    { name: 'Outcome', value: capitalised(outcomeLabel) },
    { name: 'Kind', value: kindWords[outcome.kind].name },
    ...targetFacts(outcome, outcomeUnit, test.hypothesis === 'superiority' ? 'Target' : 'Assumed'),
  ];
}

function targetFacts(outcome: QuestionOutcome, unit: string, looked: 'Target' | 'Assumed'): Fact[] {
  switch (outcome.kind) {
    case 'continuous':
      return [{ name: `${looked} difference`, value: withUnit(figure(outcome.difference), unit) }];
    case 'binary':
      return [{ name: `${looked} difference`, value: points(outcome.difference) }];
    case 'time-to-event':
      return [
        { name: `${looked} hazard ratio`, value: figure(outcome.hazardRatio) },
        { name: 'Survival stated at', value: `${figure(outcome.survivalAt)} months` },
        {
          name: 'Accrual, then follow-up',
          value: `${figure(outcome.accrual)}, ${figure(outcome.followUp)} months`,
        },
      ];
    case 'count':
      return [
        { name: `${looked} rate ratio`, value: figure(outcome.rateRatio) },
        { name: 'Exposure of each participant', value: figure(outcome.exposure) },
      ];
    case 'ordinal':
      return [
        { name: `${looked} odds ratio`, value: figure(outcome.oddsRatio) },
        {
          name: 'Controls by category',
          value: outcome.controlProbabilities.map((share) => percent(share, 3)).join(', '),
        },
      ];
  }
}

function testFacts(study: StudyView): Fact[] {
  const { test } = study.plan;
  const margin = marginInWords(study);
  return [
    { name: 'Hypothesis', value: capitalised(test.hypothesis) },
    ...(margin === undefined ? [] : [{ name: 'Margin', value: margin }]),
    { name: 'Type I error', value: percent(test.alpha, 3) },
  ];
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <TitledSection title={title} level={2}>
      {children}
    </TitledSection>
  );
}

function Texts({ texts }: { texts: [name: string, text: string][] }) {
  const styles = useStyles();
  return (
    <dl className={styles.text}>
      {texts.map(([name, text]) => (
        <div key={name}>
          <dt className={styles.name}>{name}</dt>
          <dd>{text || 'Not said yet'}</dd>
        </div>
      ))}
    </dl>
  );
}
