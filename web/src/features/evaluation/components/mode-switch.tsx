import { inWords } from '../../../shared/format/in-words';
import { symbolText } from '../../../shared/format/symbol-parts';
import type { CorrelationDefinition } from '@merestone/engine';
import { useMemo } from 'react';
import type { Duty, DutyChange, DutyMode } from '../model/duty';
import { givenGroups } from '../model/given-groups';

/** More names than this say less than one word for them all. */
const MANY = 3;

interface ModeSwitchProps {
  definition: CorrelationDefinition;
  duty: Duty;
  change: (change: DutyChange) => void;
}

/** Whether the quantities are typed in, or the groups that somebody has already. */
export function ModeSwitch({ definition, duty, change }: ModeSwitchProps) {
  const groups = useMemo(() => givenGroups(definition).groups, [definition]);
  if (groups.length === 0) return null;
  const names = groups.map((group) => symbolText(group.symbol));
  const choice = (mode: DutyMode, words: string) => (
    <label>
      <input
        type="radio"
        name="duty-mode"
        checked={duty.mode === mode}
        onChange={() => change({ do: 'switch-mode', mode })}
      />
      {words}
    </label>
  );
  return (
    <fieldset className="duty-mode">
      <legend className="heard-only">What do you have?</legend>
      {choice('quantities', 'I have the quantities')}
      {choice('groups', names.length > MANY ? 'I have the groups' : `I have ${inWords(names)}`)}
    </fieldset>
  );
}
