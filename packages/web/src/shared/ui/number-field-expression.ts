import {
  type ConstantNode,
  create,
  type FunctionNode,
  type MathNode,
  type OperatorNode,
  type ParenthesisNode,
  parseDependencies,
  type SymbolNode,
} from 'mathjs/number';

const { parse } = create(parseDependencies ?? {});

const operators: Record<string, (...values: number[]) => number> = {
  add: (a = Number.NaN, b = Number.NaN) => a + b,
  subtract: (a = Number.NaN, b = Number.NaN) => a - b,
  multiply: (a = Number.NaN, b = Number.NaN) => a * b,
  divide: (a = Number.NaN, b = Number.NaN) => a / b,
  pow: (a = Number.NaN, b = Number.NaN) => a ** b,
  unaryMinus: (a = Number.NaN) => -a,
  unaryPlus: (a = Number.NaN) => a,
};
const functions: Record<string, (value: number) => number> = {
  sqrt: Math.sqrt,
  exp: Math.exp,
  ln: Math.log,
  log: Math.log,
};

/** What an expression such as “√3”, “12/0.88” or “2^(1/2)” comes to; NaN when it is none. */
export function valueOfExpression(text: string): number {
  try {
    const value = worth(parse(spelledOut(text)));
    return Number.isFinite(value) ? value : Number.NaN;
  } catch {
    return Number.NaN;
  }
}

const spelledOut = (text: string): string =>
  text
    .replaceAll(/√\s*(\d+(?:\.\d+)?)/g, 'sqrt($1)')
    .replaceAll('√', 'sqrt')
    .replaceAll(/[×·]/g, '*')
    .replaceAll('÷', '/')
    .replaceAll('²', '^2');

const numberIn = (value: unknown): number => (typeof value === 'number' ? value : Number.NaN);

/** Numbers, arithmetic and a few functions; whatever else the parser knows is not a number here. */
function worth(node: MathNode): number {
  switch (node.type) {
    case 'ConstantNode':
      return numberIn((node as ConstantNode).value);
    case 'ParenthesisNode':
      return worth((node as ParenthesisNode).content);
    case 'SymbolNode':
      return (node as SymbolNode).name === 'pi' ? Math.PI : Number.NaN;
    case 'OperatorNode': {
      const { fn, args } = node as OperatorNode;
      return operators[fn]?.(...args.map(worth)) ?? Number.NaN;
    }
    case 'FunctionNode': {
      const { fn, args } = node as FunctionNode;
      const [only, ...rest] = args;
      const apply = functions[(fn as unknown as SymbolNode).name];
      return apply && only && rest.length === 0 ? apply(worth(only)) : Number.NaN;
    }
    default:
      return Number.NaN;
  }
}
