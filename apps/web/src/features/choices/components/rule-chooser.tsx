import { Select } from '@/components/select.tsx';
import { useChoices } from '../choices-view.ts';
import { EVERY_CHECK } from '../use-stick-address.ts';

interface RuleChooserProps {
  rule: string;
  /** Rules that the dimension moves. */
  ruleIds: readonly string[];
  /** The dimension's own, which leads the list. */
  first: string;
  onChange: (rule: string) => void;
}

/** Whose bands are shown: one check, or every check that the dimension moves. */
export function RuleChooser({ rule, ruleIds, first, onChange }: RuleChooserProps) {
  const { ruleBook } = useChoices();
  const others = ruleIds.filter((id) => id !== first);
  const options = [...(first === EVERY_CHECK ? [] : [first]), ...others].map((id) => ({
    value: id,
    words: ruleBook.rule(id).name,
  }));
  const all = { value: EVERY_CHECK, words: 'Every check it moves' };
  return (
    <Select
      label="Check"
      value={rule}
      options={first === EVERY_CHECK ? [all, ...options] : [...options, all]}
      onChange={onChange}
    />
  );
}
