/** “A”, “A and B”, “A, B and C”. */
export function list(parts: readonly string[]): string {
  return parts.length < 2 ? (parts[0] ?? '') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;
}

export const capitalised = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

const smallNumbers = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

/** “three options”; figures from ten on. */
export function counted(number: number, one: string, many: string): string {
  return `${smallNumbers[number] ?? number} ${number === 1 ? one : many}`;
}
