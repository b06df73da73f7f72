import { METHOD_ERRORS } from '../../../../shared/method-error.ts';
import { WARNINGS } from '../../../../shared/warnings.ts';
import { NamedLines } from './plain-lines.tsx';

/** All that a result may warn of. */
export function WarningsList() {
  return <NamedLines label="Warnings" lines={Object.entries(WARNINGS)} />;
}

/** All that is refused, since there would be no figure to trust. */
export function RefusalsList() {
  const lines = Object.entries(METHOD_ERRORS).map(
    ([code, meaning]) => [code.replaceAll('-', ' '), `${meaning}.`] as const,
  );
  return <NamedLines label="What is refused" lines={lines} />;
}
