import { normalCdf } from '../src/distributions/normal.js';

/**
 * The number that a line of TeX amounts to; undefined where it is no arithmetic, as in an equation to be solved,
 * a tail probability or an integral.
 */
export function texValue(tex: string): number | undefined {
  if (/[=<>]|\\ge|\\le(?!ft)|\\min|\\int|\\sum|\\text|\\infty|\\begin|P\\!/.test(tex)) return undefined;
  const tokens =
    tex
      .replace(/\\t?frac(\d)/g, '\\frac{$1}')
      .replace(/(\\frac\{\d\})(\d)/g, '$1{$2}')
      .replace(/\\(left|right|bigl|bigr|Bigl|Bigr|!|,)/g, ' ')
      .match(/\\[a-zA-Z]+|\d+\.?\d*|[()[\]{}|^_+\-/]|[a-z]/g) ?? [];
  const reader = new TexReader(tokens);
  const value = reader.sum();
  if (!reader.done) throw new Error(`${tex} is not understood from “${reader.next}” on`);
  return value;
}

class TexReader {
  private position = 0;

  constructor(private readonly tokens: readonly string[]) {}

  get next(): string | undefined {
    return this.tokens[this.position];
  }

  get done(): boolean {
    return this.position >= this.tokens.length;
  }

  sum(): number {
    let total = this.takes('-') ? -this.product() : this.product();
    for (;;) {
      if (this.takes('+')) total += this.product();
      else if (this.takes('-')) total -= this.product();
      else return total;
    }
  }

  private product(): number {
    let product = this.power();
    for (;;) {
      if (this.takes('\\times')) product *= this.power();
      else if (this.takes('/')) product /= this.power();
      else if (this.next !== undefined && !/^[)\]}|+-]$|^\\r(ceil|floor)$/.test(this.next)) {
        product *= this.power();
      } else return product;
    }
  }

  private power(): number {
    const base = this.base();
    return this.takes('^') ? base ** this.group() : base;
  }

  private base(): number {
    const token = this.take();
    switch (token) {
      case '(':
        return this.closed(')');
      case '[': {
        const inner = this.closed(']');
        if (!this.takes('_')) return inner;
        this.expect('+');
        return Math.max(0, inner);
      }
      case '{':
        return this.closed('}');
      case '|':
        return Math.abs(this.closed('|'));
      case '\\lceil':
        return Math.ceil(this.closed('\\rceil') - 1e-9);
      case '\\frac':
      case '\\tfrac':
        return this.group() / this.group();
      case '\\sqrt':
        return Math.sqrt(this.group());
      case '\\log':
        return Math.log(this.product());
      case '\\arcsin':
        return Math.asin(this.power());
      case '\\Phi':
        return normalCdf(this.base());
      case 'e':
        return Math.E;
      default: {
        const value = Number(token);
        if (Number.isNaN(value)) throw new Error(`“${token}” is no number in ${this.tokens.join(' ')}`);
        return value;
      }
    }
  }

  /** An argument: a group in braces, or the single digit or command that follows. */
  private group(): number {
    if (this.takes('{')) return this.closed('}');
    return this.base();
  }

  private closed(close: string): number {
    const value = this.sum();
    this.expect(close);
    return value;
  }

  private takes(token: string): boolean {
    if (this.next !== token) return false;
    this.position += 1;
    return true;
  }

  private take(): string {
    const token = this.next;
    if (token === undefined) throw new Error(`${this.tokens.join(' ')} ends too early`);
    this.position += 1;
    return token;
  }

  private expect(token: string): void {
    if (this.take() !== token) throw new Error(`no ${token} in ${this.tokens.join(' ')}`);
  }
}
