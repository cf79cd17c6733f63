import { zodResolver } from '@hookform/resolvers/zod';
import type { OptionView } from '@steelyard/api/contract/design-sets';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { startTransition, useEffect, useLayoutEffect, useRef, useState } from 'react';
import { type FieldPath, useForm } from 'react-hook-form';
import { ApiError } from '../../../shared/api/client';
import { placeFaults } from '../../../shared/api/faults';
import { sessionQuery } from '../../access/api/access';
import { keepOption, storedOption } from '../../designs/api/design-set';
import type { OptionDraft } from '../../designs/families/family-ui';
import { draftKey, dropDraft, keepDraft, type PlanSize, useDrafts } from '../../designs/model/drafts';
import { rebase } from '../../designs/model/drafts-of-sizes';
import { cleaned, draftOf, sameOption } from '../../designs/model/option-draft';
import { optionDraftSchema } from '../../designs/model/option-draft-schema';
import type { Weighed } from '../../weigh/model/weighing';
import { changeOption } from './options';

/**
 * An option's form. It shows the person's draft or, where there is none, what is stored. What is drawn of either may be
 * old by the time something is typed or answered: both are read where they are kept.
 */
export function useOptionForm(studyId: string, { id, stored, draft }: Weighed) {
  const queryClient = useQueryClient();
  const session = useQuery(sessionQuery()).data?.id ?? '';
  // Whoever began it, also when their session ends meanwhile.
  const [personId] = useState(session);
  const key = draftKey(personId, id);
  const edited = useDrafts(({ drafts }) => key in drafts);
  const [fault, setFault] = useState<string>();
  const [saved, setSaved] = useState(false);
  const form = useForm<OptionDraft>({
    mode: 'onChange',
    defaultValues: draft ? { name: draft.name, plan: draft.plan } : draftOf(stored),
    resolver: (values, context, options) =>
      zodResolver<OptionDraft, unknown, OptionDraft>(optionDraftSchema as never)(
        cleaned(values),
        context,
        options,
      ),
  });
  const { watch, setError } = form;
  // What is shown while there is no draft, which the next one begins from.
  const shown = useRef(draftOf(stored));
  const turn = useRef<Promise<unknown>>(Promise.resolve());

  const draftNow = () => useDrafts.getState().drafts[key];
  const storedNow = () => storedOption(queryClient, studyId, id) ?? stored;

  // Form and draft follow each other; what one does to the other is not news to it.
  const following = useRef(false);
  const follow = (work: () => void) => {
    if (following.current) return;
    following.current = true;
    work();
    following.current = false;
  };

  const showStored = () => {
    shown.current = draftOf(storedNow());
    if (!sameOption(form.getValues(), shown.current)) form.reset(shown.current);
  };

  useEffect(() => {
    const { unsubscribe } = watch((values) =>
      follow(() => {
        const typed = structuredClone(values) as OptionDraft;
        const kept = draftNow();
        const base = kept?.base ?? shown.current;
        if (sameOption(typed, kept ?? base)) return;
        setSaved(false);
        if (sameOption(typed, base)) dropDraft(key);
        else keepDraft(key, { ...typed, base });
      }),
    );
    return unsubscribe;
  }, [watch, key]);

  // Before anything can be typed into what somebody else has changed.
  useLayoutEffect(() => {
    if (!draftNow()) follow(showStored);
  }, [stored]);

  useEffect(
    () =>
      useDrafts.subscribe(({ drafts }, before) => {
        const kept = drafts[key];
        if (kept === before.drafts[key]) return;
        follow(() => {
          if (!kept) return showStored();
          const { name, plan } = kept;
          if (!sameOption(sized(form.getValues(), plan), kept)) return form.reset({ name, plan });
          // Sizes are moved on the canvas; the form follows when there is time.
          startTransition(() => {
            for (const size of ['units', 'clusterSize'] as const) {
              if (form.getValues(`plan.${size}`) !== plan[size]) form.setValue(`plan.${size}`, plan[size]);
            }
          });
        });
      }),
    [form, key],
  );

  const save = async (values: OptionDraft) => {
    const { version } = storedNow();
    const base = draftNow()?.base;
    // All was saved by the time this had its turn, or somebody else's version is to be settled first.
    if (!base || !sameOption(base, draftOf(storedNow()))) return;
    setFault(undefined);
    try {
      const option = await changeOption(studyId, id, { version, ...values });
      keepOption(queryClient, studyId, option);
      rebase(personId, option);
      setSaved(true);
    } catch (error) {
      const current = error instanceof ApiError ? error.problem.current : undefined;
      if (current) keepOption(queryClient, studyId, current as OptionView);
      setFault(placeFaults(error, fieldsOf(values), setError));
    } finally {
      void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
    }
  };

  return {
    form,
    /** Whether something is typed that is not stored. */
    edited,
    saved,
    fault,
    /** Stores what is typed, once what was sent before is answered. */
    submit: () => {
      turn.current = turn.current.catch(() => undefined).then(() => form.handleSubmit(save)());
    },
    takeStored: () => {
      setFault(undefined);
      dropDraft(key);
    },
    /** Goes on from what somebody else stored. */
    keepMine: () => rebase(personId, stored),
  };
}

/** An option at another's size. */
const sized = ({ name, plan }: OptionDraft, { units, clusterSize }: PlanSize): OptionDraft => ({
  name,
  plan: { ...plan, units, clusterSize },
});

/** Every field that the server may name in a refusal. */
function fieldsOf({ plan }: OptionDraft): FieldPath<OptionDraft>[] {
  return [
    'name',
    'plan.units',
    'plan.clusterSize',
    'plan.treatments',
    'plan.repeated.baselines',
    'plan.repeated.followUps',
    'plan.multiplicityReason',
    ...pathsIn(plan.structure, 'plan.structure'),
    ...Object.keys(plan.overrides).map((key) => `plan.overrides.${key}.value` as FieldPath<OptionDraft>),
  ];
}

/** The paths of a structure and of all its parts, those within first. */
function pathsIn(part: unknown, path: string): FieldPath<OptionDraft>[] {
  const inner = typeof part === 'object' && part !== null ? Object.entries(part) : [];
  return [
    ...inner.flatMap(([key, value]) => pathsIn(value, `${path}.${key}`)),
    path as FieldPath<OptionDraft>,
  ];
}
