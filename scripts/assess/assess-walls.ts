import { assessCaseWall } from '../../shared/assessment/assess-case-wall.ts';
import { modelOfCase, type CaseModel } from '../../shared/assessment/model-of-case.ts';
import { MethodError } from '../../shared/method-error.ts';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { CaseError } from './case-error.ts';

type Walls = AssessCase['walls'];

/** A part of the walls as JSON, or the first of them that the method refuses. */
export type Part = { readonly json: string } | { readonly wall: number; readonly fault: string };

export function preparedCase(input: Omit<AssessCase, 'walls'>): CaseModel {
  try {
    return modelOfCase(input);
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    throw new CaseError(`${error.field ?? 'drives'}: ${error.message}`);
  }
}

/** Assesses walls one by one; `first` is the index of the first of them in the case. */
export function assessWalls(prepared: CaseModel, walls: Walls, first: number): Part {
  const results: string[] = [];
  for (const [index, wall] of walls.entries()) {
    try {
      results.push(JSON.stringify(assessCaseWall(prepared, wall)));
    } catch (error) {
      if (!(error instanceof MethodError)) throw error;
      const field = error.field === undefined ? '' : `.${error.field}`;
      const place = `walls[${first + index}]${field}`;
      return { wall: first + index, fault: `${place}: ${error.message}` };
    }
  }
  return { json: results.join(',\n') };
}
