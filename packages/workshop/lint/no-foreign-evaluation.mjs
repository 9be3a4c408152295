/** What expr-eval offers beside parsing. None of it may run: an expression of a user could reach code through it. */
const forbidden = new Set(['evaluate', 'toJSFunction', 'simplify', 'substitute']);

/**
 * @typedef {object} TypedServices
 * @property {import('typescript').Program} program
 * @property {{ get(node: unknown): import('typescript').Node }} esTreeNodeToTSNodeMap
 */

/** @param {import('estree').MemberExpression} node */
const propertyNameOf = ({ computed, property }) => {
  if (!computed) return property.type === 'Identifier' ? property.name : undefined;
  return property.type === 'Literal' && typeof property.value === 'string' ? property.value : undefined;
};

/**
 * Refuses expr-eval's own evaluation by the type that a method comes from, so that functions of ours may be called
 * evaluate. `toJSFunction` is refused whatever its object is.
 * @type {import('eslint').Rule.RuleModule}
 */
export const noForeignEvaluation = {
  meta: {
    type: 'problem',
    messages: {
      foreign:
        "expr-eval only parses here; its own {{name}} stays unused. The engine's compiled closures evaluate.",
    },
    schema: [],
  },
  create(context) {
    /** @type {TypedServices} */
    const { program, esTreeNodeToTSNodeMap } = context.sourceCode.parserServices;
    const checker = program.getTypeChecker();

    /**
     * @param {import('estree').Node} holder of the property
     * @param {string} name
     */
    const isForeign = (holder, name) => {
      const property = checker.getTypeAtLocation(esTreeNodeToTSNodeMap.get(holder)).getProperty(name);
      return (property?.declarations ?? []).some((declaration) =>
        /[\\/]expr-eval(-fork)?[\\/]/.test(declaration.getSourceFile().fileName),
      );
    };

    /**
     * @param {import('estree').Node} node to point at
     * @param {import('estree').Node} holder
     * @param {string | undefined} name
     */
    const judge = (node, holder, name) => {
      if (name === undefined || !forbidden.has(name)) return;
      if (name === 'toJSFunction' || isForeign(holder, name))
        context.report({ node, messageId: 'foreign', data: { name } });
    };

    return {
      MemberExpression(node) {
        judge(node.property, node.object, propertyNameOf(node));
      },
      ObjectPattern(node) {
        for (const property of node.properties) {
          if (property.type === 'Property' && property.key.type === 'Identifier')
            judge(property.key, node, property.key.name);
        }
      },
    };
  },
};
