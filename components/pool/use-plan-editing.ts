import { useEffect, useRef, useState } from 'react';
import { useWatch } from 'react-hook-form';
import { previewPool, savePlan } from '@/shared/contracts/pool';
import { type PlanTurns, planTurns, type PoolPlan, type ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { useQuestion } from '../data/use-question';
import { useSignedIn } from '../data/use-session';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';

const pause = 300;

type Stored = { code: string; plan: PoolPlan; reckoned: ReckonedPool };

/** The plan as it is being turned: what is typed, what it gives, and whether it is stored. */
export function usePlanEditing({ code, plan, reckoned }: Stored) {
  const { may } = useSignedIn();
  const stored = turnsOf(plan);
  const draft = useDraftForm({ name: `pool ${code}`, schema: planTurns, defaultValues: stored });
  useStoredChange(stored, (changedTo) => {
    if (!draft.form.formState.isDirty) draft.form.reset(changedTo);
  });
  const typed = planTurns.safeParse(useWatch({ control: draft.form.control }));
  const turned = useSettled(typed.success ? typed.data : stored);
  const isStored = same(turned, stored);
  const asked = { ...plan, ...turned };
  const preview = useQuestion(previewPool, { params: { type: code }, body: asked, enabled: !isStored });
  const post = usePost(savePlan, { refreshes: ['parts'] });
  return {
    draft,
    plan: asked,
    reckoned: isStored ? reckoned : (preview.data ?? reckoned),
    problem: isStored ? null : preview.error,
    changed: !typed.success || !same(typed.data, stored),
    mayPlan: may('plan pool'),
    undo: draft.startFresh,
    save: async (body: PlanTurns) => {
      await post.mutateAsync({ params: { type: code }, body: { ...plan, ...body } });
      announce(text.pool.saved);
    },
  };
}
export type PlanEditing = ReturnType<typeof usePlanEditing>;

const turnsOf = ({ bufferDays, coverPct, travel }: PoolPlan): PlanTurns => ({ bufferDays, coverPct, travel });

const same = (a: PlanTurns, b: PlanTurns) =>
  a.bufferDays === b.bufferDays && a.coverPct === b.coverPct && a.travel === b.travel;

/** A plan that was changed elsewhere is shown, unless something is being turned here; what was typed before a reload stays. */
function useStoredChange(stored: PlanTurns, onChange: (stored: PlanTurns) => void) {
  const before = useRef(stored);
  useEffect(() => {
    if (same(before.current, stored)) return;
    before.current = stored;
    onChange(stored);
  });
}

/** The value once it has stood still for a moment, so that not every keystroke is asked about. */
function useSettled(value: PlanTurns): PlanTurns {
  const written = JSON.stringify(value);
  const [settled, setSettled] = useState(written);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(written), pause);
    return () => clearTimeout(timer);
  }, [written]);
  return JSON.parse(settled) as PlanTurns;
}
