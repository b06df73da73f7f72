import type { RulesVersion } from '../../../../shared/schemas/rules.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { ValueChanges } from '../../../components/ui/value-changes.tsx';
import { ruleChanges } from '../rule-lines.ts';

type RulesChangeProps = { readonly before: RulesVersion; readonly after: RulesVersion };

/** What a version changed in the one before it. */
export function RulesChange({ before, after }: RulesChangeProps) {
  const title = `What version ${after.version} changed`;
  return (
    <Panel title={title}>
      <ValueChanges label={title} changes={ruleChanges(before.rules, after.rules)} />
    </Panel>
  );
}
