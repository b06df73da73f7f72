import { useState } from 'react';
import { reasonAgainst, TOOLS, type Situation, type ToolId } from '../tools.ts';
import { ToolButton } from './tool-button.tsx';

type ToolColumnProps = {
  readonly situation: Situation;
  readonly onPress: (tool: ToolId) => void;
};

/** The tools that draw: down the left of the map, on a phone under it. */
export function ToolColumn({ situation, onPress }: ToolColumnProps) {
  const [refused, setRefused] = useState<ToolId | null>(null);
  const reason = refused === null ? null : reasonAgainst(refused, situation);

  function press(tool: ToolId): void {
    setRefused(tool);
    onPress(tool);
  }
  return (
    <div className="max-md:border-t max-md:border-ink max-md:bg-paper-raised md:absolute md:top-[126px] md:left-3">
      <div
        role="group"
        aria-label="Draw buildings"
        className="flex p-[3px] max-md:justify-between md:w-fit md:flex-col md:rounded md:border md:border-rule md:bg-paper-raised md:shadow-lift"
      >
        {TOOLS.map((tool) => (
          <ToolButton
            key={tool.id}
            tool={tool}
            isOn={situation.tool === tool.id}
            reason={reasonAgainst(tool.id, situation)}
            onPress={() => {
              press(tool.id);
            }}
          />
        ))}
      </div>
      <p
        role="status"
        className="text-small text-ink-2 max-md:px-4 max-md:not-empty:pb-2 md:sr-only"
      >
        {reason}
      </p>
    </div>
  );
}
