import type { RegisterView as RegisterViewAnswer } from '../../shared/schemas/register-views.ts';
import type { RegisterView } from '../models/register-view.ts';

/** A kept view as its keeper sees it. */
export function presentRegisterView(view: RegisterView): RegisterViewAnswer {
  const { id, name, filter, sort, columns } = view;
  return { id, name, filter, sort, columns };
}
