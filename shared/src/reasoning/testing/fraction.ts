/** Exact rational numbers, for checks that leave no room for rounding. */
export class Fraction {
  private constructor(
    readonly numerator: bigint,
    readonly denominator: bigint,
  ) {}

  static of(numerator: bigint, denominator: bigint = 1n): Fraction {
    const sign = denominator < 0n ? -1n : 1n;
    let [a, b] = [numerator < 0n ? -numerator : numerator, denominator < 0n ? -denominator : denominator];
    while (b !== 0n) [a, b] = [b, a % b];
    const divisor = (a === 0n ? 1n : a) * sign;
    return new Fraction(numerator / divisor, denominator / divisor);
  }

  /** The exact value of a number: every finite one is a whole number divided by a power of two. */
  static from(number: number): Fraction {
    let [whole, power] = [number, 0n];
    while (!Number.isInteger(whole)) {
      whole *= 2;
      power += 1n;
    }
    return Fraction.of(BigInt(whole), 2n ** power);
  }

  plus(other: Fraction): Fraction {
    return Fraction.of(
      this.numerator * other.denominator + other.numerator * this.denominator,
      this.denominator * other.denominator,
    );
  }

  minus(other: Fraction): Fraction {
    return this.plus(Fraction.of(-other.numerator, other.denominator));
  }

  times(other: Fraction): Fraction {
    return Fraction.of(this.numerator * other.numerator, this.denominator * other.denominator);
  }

  over(other: Fraction): Fraction {
    return Fraction.of(this.numerator * other.denominator, this.denominator * other.numerator);
  }

  isLessThan(other: Fraction): boolean {
    return this.numerator * other.denominator < other.numerator * this.denominator;
  }

  /** The nearest number, or one next to it. */
  toNumber(): number {
    const scale = 10n ** 30n;
    return Number((this.numerator * scale) / this.denominator) / 1e30;
  }
}
