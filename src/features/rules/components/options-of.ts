import type { Option } from '../../../components/ui/select.tsx';

/** Words as options to choose from. */
export function optionsOf(words: Readonly<Record<string, string>>): Option[] {
  return Object.entries(words).map(([value, label]) => ({ value, label }));
}
