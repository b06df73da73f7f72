import { BasisLine } from '../../../components/layout/basis-line.tsx';
import type { CrsAnswer } from '../../../../shared/schemas/crs.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { OptionMenu } from '../../alignments/components/option-menu.tsx';
import { designParts } from '../../alignments/design-words.ts';
import type { PlanLine } from '../../alignments/hooks/use-plan-line.ts';

type PlanBasisProps = {
  readonly scheme: SchemeAnswer;
  readonly crs: CrsAnswer | undefined;
  /** The line that is shown; a page without it says nothing of one. */
  readonly line?: PlanLine;
};

function lineParts(line: PlanLine) {
  const { editor, options, design } = line;
  const name = editor.isEditing && (
    <b key="option">{editor.base?.name ?? 'New option'}, being changed</b>
  );
  const menu = options.length > 0 && <OptionMenu key="option" line={line} />;
  const first = name === false ? menu : name;
  return [...(first === false ? [] : [first]), ...(design === null ? [] : designParts(design))];
}

/** What the plan rests on: the option of the line and its values, the register and the grid. */
export function PlanBasis({ scheme, crs, line }: PlanBasisProps) {
  const grid = crs === undefined ? `EPSG:${scheme.crs}` : `${crs.name}, EPSG:${crs.code}`;
  const isPreview = line?.hasContours === true;
  return (
    <BasisLine
      preview={isPreview || line?.editor.isEditing === true}
      parts={[
        ...(line === undefined ? [] : lineParts(line)),
        <b key="register">Register as it stands</b>,
        ...(isPreview ? [] : [`Grid ${grid}`]),
      ]}
      end={isPreview ? <b>Preview, not a run: central settlement</b> : 'Nothing worked out yet'}
    />
  );
}
