import type { OptionPlan } from '@steelyard/calc';
import { type Fact, Facts } from '../../../shared/ui/facts';
import { structureInWords } from '../model/structure-words';

/** An option's structure to read, and why several comparisons are treated as they are. */
export function StructureFacts({ plan }: { plan: OptionPlan }) {
  const facts = structureInWords(plan.structure).map(([name, value]): Fact => ({ name, value }));
  const { multiplicityReason } = plan;
  return (
    <>
      <Facts facts={facts} />
      {multiplicityReason && <p>Why this stance on several comparisons: {multiplicityReason}</p>}
    </>
  );
}
