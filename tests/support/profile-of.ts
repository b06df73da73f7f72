import { profileFromNodes, type Profile } from '../../shared/building/profile.ts';
import { valueAt } from './polynomial.ts';

function derivative(c: readonly number[]): number[] {
  return c.slice(1).map((coefficient, k) => (k + 1) * coefficient);
}

/**
 * The profile of a wall whose settlement and displacement are polynomials in the distance along it,
 * lowest coefficient first: exact up to the fifth and the third power.
 */
export function profileOf(
  length: number,
  settlement: readonly number[],
  displacement: readonly number[] = [0],
  intervals = 4,
): Profile {
  const nodes = Float64Array.from({ length: intervals + 1 }, (_, k) => (k * length) / intervals);
  const quantities = [
    settlement,
    derivative(settlement),
    derivative(derivative(settlement)),
    displacement,
    derivative(displacement),
  ];
  const values = Float64Array.from([...nodes].flatMap((x) => quantities.map((c) => valueAt(c, x))));
  return profileFromNodes(nodes, values);
}
