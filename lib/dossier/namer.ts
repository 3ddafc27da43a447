/** What stands for a person's name in a dossier. */
export type Namer = (name: string) => string;

/**
 * Names as they are, or withheld: "Technician 1", "Technician 2", by the order in which they appear. One person keeps one
 * number throughout a dossier; two of one name share it, as they would share the name.
 *
 * @example
 * const name = makeNamer({ withheld: true });
 * [name('Ada'), name('Bo'), name('Ada')] // ['Technician 1', 'Technician 2', 'Technician 1']
 */
export function makeNamer({ withheld }: { withheld: boolean }): Namer {
  if (!withheld) return (name) => name;
  const numbers = new Map<string, number>();
  return (name) => {
    const number = numbers.get(name) ?? numbers.size + 1;
    numbers.set(name, number);
    return `Technician ${number}`;
  };
}
