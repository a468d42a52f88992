/** Points of one panel, and what turns a function's values there into its running integral. */
export type Panel = {
  /** From −1 to 1, ascending. */
  readonly points: readonly number[];
  /** Row i integrates from −1 to point i; the last row over the whole panel. */
  readonly running: readonly (readonly number[])[];
};

/**
 * Running integrals of a smooth function by the Chebyshev series through its values at `degree` + 1 points.
 *
 * @param degree a whole number of at least 2
 * @see Clenshaw and Curtis (1960), Numerische Mathematik 2, 197–205 (from memory)
 */
export function chebyshevPanel(degree: number): Panel {
  const orders = Array.from({ length: degree + 1 }, (_, order) => order);
  const angles = orders.map((index) => Math.PI * (1 - index / degree));
  const half = (index: number) => (index === 0 || index === degree ? 0.5 : 1);
  const integrals = angles.map((angle) => orders.map((order) => chebyshevIntegral(order, angle)));
  const running = integrals.map((upTo) =>
    angles.map((angle, index) => {
      const terms = upTo.map((integral, order) => half(order) * Math.cos(order * angle) * integral);
      return (2 / degree) * half(index) * terms.reduce((sum, one) => sum + one, 0);
    }),
  );
  return { points: angles.map(Math.cos), running };
}

/** Integral of the Chebyshev polynomial of an order from −1 to the cosine of an angle. */
function chebyshevIntegral(order: number, angle: number): number {
  if (order === 0) return Math.cos(angle) + 1;
  if (order === 1) return (Math.cos(angle) ** 2 - 1) / 2;
  const at = (theta: number) =>
    (Math.cos((order + 1) * theta) / (order + 1) - Math.cos((order - 1) * theta) / (order - 1)) / 2;
  return at(angle) - at(Math.PI);
}
