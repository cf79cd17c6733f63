import { makeStyles, tokens } from '@fluentui/react-components';
import type { StudyView } from '@steelyard/api/contract/studies';
import type { ReactNode } from 'react';
import { capitalised } from '../../../shared/format/lists';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { type Fact, Facts } from '../../../shared/ui/facts';
import { TitledSection } from '../../../shared/ui/titled-section';
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
        <Facts facts={[...outcomeFacts(study), { name: 'Type I error', value: percent(test.alpha, 3) }]} />
        <p>{test.sides === 2 ? 'The test is two-sided.' : 'The test is one-sided.'}</p>
        {outcome.better && (
          <p>{`A ${outcome.better} ${outcome.kind === 'binary' ? 'proportion' : 'value'} is better.`}</p>
        )}
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

function outcomeFacts({ plan: { outcome }, outcomeLabel, outcomeUnit }: StudyView): Fact[] {
  const shown =
    outcome.kind === 'binary'
      ? percent(outcome.difference, 3).replace('%', 'percentage points')
      : withUnit(figure(outcome.difference), outcomeUnit);
  return [
    { name: 'Outcome', value: capitalised(outcomeLabel) },
    { name: 'Kind', value: outcome.kind === 'binary' ? 'Binary' : 'Continuous' },
    { name: 'Target difference', value: shown },
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
