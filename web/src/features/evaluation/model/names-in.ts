const NUMBER = /(?<![A-Za-z_0-9])(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/g;
const NAME = /[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)?/g;

/** Every name in an expression, functions included, as often as it stands there. */
export function namesIn(expression: string): string[] {
  return expression.replace(NUMBER, ' ').match(NAME) ?? [];
}
