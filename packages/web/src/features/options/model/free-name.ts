/** The name itself, or with the first number that makes it differ from those taken. */
export function freeName(name: string, taken: readonly string[]): string {
  for (let number = 2, free = name; ; number += 1) {
    if (!taken.includes(free)) return free;
    free = `${name} ${number}`;
  }
}
