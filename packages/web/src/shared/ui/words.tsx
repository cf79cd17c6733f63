import { makeStyles, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { Hint } from './hint';

/** What our own words mean; trade terms stay as they are. */
const meanings = {
  study: 'One research question with its target difference, and everything assumed to answer it.',
  option: 'One candidate design: its structure, its size, and any planning value it takes differently.',
  hold: 'What is kept equal while options are compared.',
  limit:
    'The most clusters, participants per cluster, money or months that exist; the first broken is binding.',
  ruling: 'Whether an option may be chosen at all, and why: admissible, with conditions, or not.',
  choice: 'The option settled on, why, and why not each other.',
  beam: 'What one option takes, as a bar split by arm or phase, on the same scale as the others.',
  tradeOff: 'Every option as a curve over its size: what each size takes, and what it gives.',
  ledger: 'The list of what this study assumes: each value with its range and where it comes from.',
  planningValue: 'One assumption: a value with its range, its source, who set it and when.',
  lever: 'A change that cuts participants, and what it costs in money, months, visits and validity.',
  override: 'This option takes a value of its own in place of the ledger’s, for the reason given.',
} as const;

const useStyles = makeStyles({
  word: {
    textDecorationLine: 'underline',
    textDecorationStyle: 'dotted',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
  },
  chip: {
    padding: '1px 10px',
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: '999px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    fontSize: '13px',
    lineHeight: '22px',
  },
});

interface WordProps {
  is: keyof typeof meanings;
  chip?: boolean;
  children: ReactNode;
}

/** One of our own words, which shows what it means. */
export function Word({ is, chip, children }: WordProps) {
  const styles = useStyles();
  return (
    <Hint says={meanings[is]} className={chip ? styles.chip : styles.word}>
      {children}
    </Hint>
  );
}
