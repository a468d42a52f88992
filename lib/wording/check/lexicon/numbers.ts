type Below100 = {
  /** 0 to 19, and what else is one word. */
  small: Readonly<Record<number, string>>;
  tens: Readonly<Record<number, string>>;
  /** One name for a tens and a unit: "treinta y cinco". */
  joined: (tens: string, unit: string, value: number) => readonly string[];
  /** The unit that follows a tens, where tens are counted in twenties: "soixante-quinze". */
  unitsUpTo: (tens: number) => number;
};

/** Numbers in words from 0 to 99, without accents, hyphens as spaces. */
export function numbersBelow100({ small, tens, joined, unitsUpTo }: Below100): Record<string, number> {
  const numbers: Record<string, number> = {};
  for (const [value, name] of Object.entries(small)) numbers[name] = Number(value);
  for (const [value, name] of Object.entries(tens)) {
    numbers[name] = Number(value);
    for (let unit = 1; unit <= unitsUpTo(Number(value)); unit += 1) {
      const word = small[unit];
      if (word === undefined || small[Number(value) + unit] !== undefined) continue;
      for (const whole of joined(name, word, Number(value) + unit)) numbers[whole] = Number(value) + unit;
    }
  }
  return numbers;
}
