import { all, create, type BigNumber } from 'mathjs';

const math = create(all ?? {}, { number: 'BigNumber', precision: 64 });

/** The value of a double to 100 digits of its binary expansion, not its shortest decimal. */
function exact(x: number): BigNumber {
  return math.bignumber(x.toPrecision(100));
}

/** eˣ to 64 digits. */
export function preciseExponential(x: number): BigNumber {
  return math.exp(exact(x));
}

/** erf x to 60 digits, by the power series of 7.1.6 of Abramowitz and Stegun, for |x| ≤ 6. */
export function preciseErf(x: number): BigNumber {
  const squared = exact(x).mul(exact(x));
  let term = exact(x);
  let sum = term;
  for (let n = 1; term.abs().gt('1e-64'); n++) {
    term = term
      .mul(squared)
      .mul(2)
      .div(2 * n + 1);
    sum = sum.add(term);
  }
  const root = math.acos(math.bignumber(-1)).sqrt();
  return sum.mul(2).div(root).mul(squared.neg().exp());
}

/** 1 − erf x to 40 digits, for |x| ≤ 6. */
export function preciseErfc(x: number): BigNumber {
  return math.bignumber(1).sub(preciseErf(x));
}

/** How far a double is from a precise value, as a share of it. */
export function relativeError(got: number, wanted: BigNumber): number {
  return exact(got).sub(wanted).div(wanted).abs().toNumber();
}
