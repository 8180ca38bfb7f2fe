/**
 * The next free pseudonym of a class: the word that its children already share, else the last word of the class's
 * name, else one of `animals` (the same one each time), and the smallest number that nobody has or had.
 */
export function suggestPseudonym(
  className: string,
  taken: readonly string[],
  animals: readonly string[],
): string {
  const word = sharedWord(taken) ?? lastWord(className) ?? animalFor(className, animals);
  const used = new Set(taken.map((name) => name.toLowerCase()));
  for (let n = 1; ; n++) {
    const name = `${word}-${String(n).padStart(2, '0')}`;
    if (!used.has(name.toLowerCase())) return name;
  }
}

/** The word before the number that most pseudonyms have. */
function sharedWord(names: readonly string[]): string | null {
  const counts = new Map<string, number>();
  for (const name of names) {
    const word = /^(.+)-\d+$/u.exec(name)?.[1];
    if (word !== undefined) counts.set(word, (counts.get(word) ?? 0) + 1);
  }
  return [...counts].sort((a, b) => b[1] - a[1])[0]?.[0] ?? null;
}

/** A class called "Class Otter" gives "Otter"; one called "3b" gives nothing, since that would tell the class. */
function lastWord(className: string): string | null {
  const word = /(\p{L}{3,})$/u.exec(className.trim())?.[1];
  return word === undefined ? null : `${word.slice(0, 1).toUpperCase()}${word.slice(1)}`;
}

function animalFor(className: string, animals: readonly string[]): string {
  const sum = [...className].reduce((total, letter) => total + (letter.codePointAt(0) ?? 0), 0);
  return animals[sum % animals.length] ?? className;
}
