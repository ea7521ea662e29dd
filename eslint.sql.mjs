/**
 * No SQL made of what somebody sent: what goes to the database as text is written out in the
 * source, and values travel beside it (bind, replacements, fn).
 */

/** Functions whose first argument reaches PostgreSQL as it is. */
const SQL = new Set(['query', 'literal', 'fn'])

const fixedSql = {
  meta: {
    type: 'problem',
    schema: [],
    messages: {
      made: 'SQL is written out, not put together: pass values by bind, replacements or fn.',
    },
  },
  create({ sourceCode, report }) {
    return {
      CallExpression(node) {
        const [text] = node.arguments
        if (!text || !SQL.has(nameOf(node.callee))) return
        if (!isWrittenOut(text, sourceCode)) report({ node: text, messageId: 'made' })
      },
    }
  },
}

function nameOf(callee) {
  if (callee.type === 'ChainExpression') return nameOf(callee.expression)
  if (callee.type === 'Identifier') return callee.name
  if (callee.type !== 'MemberExpression') return undefined
  return callee.computed ? callee.property.value : callee.property.name
}

/** A text without anything from outside: in place, or in a constant of the same file. */
function isWrittenOut(node, sourceCode) {
  const holds = (part) => isWrittenOut(part, sourceCode)
  switch (node.type) {
    case 'Literal':
      return true
    case 'TemplateLiteral':
      return node.expressions.every(holds)
    case 'BinaryExpression':
      return holds(node.left) && holds(node.right)
    case 'ConditionalExpression':
      return holds(node.consequent) && holds(node.alternate)
    case 'TSAsExpression':
    case 'TSSatisfiesExpression':
      return holds(node.expression)
    case 'Identifier': {
      const value = constantOf(node, sourceCode)
      return value !== undefined && holds(value)
    }
    default:
      return false
  }
}

function constantOf(identifier, sourceCode) {
  for (let scope = sourceCode.getScope(identifier); scope; scope = scope.upper) {
    const [definition] = scope.set.get(identifier.name)?.defs ?? []
    if (!definition) continue
    const isConstant = definition.type === 'Variable' && definition.parent.kind === 'const'
    return isConstant && definition.node.id === definition.name
      ? (definition.node.init ?? undefined)
      : undefined
  }
  return undefined
}

/** The plugin of the rule `sql/fixed`. */
export const sqlPlugin = { rules: { fixed: fixedSql } }
