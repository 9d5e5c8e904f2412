import { type ESTree, parseSync, Visitor } from 'vite';

/** The text of a string or a template, `*` where it is worked out at run time. */
function textOf(node: ESTree.Expression | ESTree.Argument | undefined): string {
  if (node?.type === 'Literal') return String(node.value);
  if (node?.type !== 'TemplateLiteral') return '*';
  return node.quasis.map(({ value }) => value.cooked).join('*');
}

/** `import.meta.url`, beside which a worker's or a picture's address is given. */
const isOwnAddress = (node: ESTree.Argument | undefined): boolean =>
  node?.type === 'MemberExpression' &&
  node.object.type === 'MetaProperty' &&
  node.property.type === 'Identifier' &&
  node.property.name === 'url';

/**
 * Everything a source imports or re-exports, in the order it stands: statements, types, dynamic
 * imports and addresses beside `import.meta.url`. A parser reads it, so that words in strings,
 * templates and comments are never taken for imports. An address worked out at run time has `*` in
 * it: relative if it begins so, else a package nobody may import. Throws on a source that does not
 * parse.
 */
export function importsOf(source: string, file = 'source.ts'): string[] {
  const { program, errors } = parseSync(file, source);
  if (errors[0]) throw new SyntaxError(`${file}: ${errors[0].message}`);
  const found: string[] = [];
  const add = ({ source: from }: { source: ESTree.Expression | null }) => {
    if (from) found.push(textOf(from));
  };
  new Visitor({
    ImportDeclaration: add,
    ExportNamedDeclaration: add,
    ExportAllDeclaration: add,
    ImportExpression: add,
    TSImportType: add,
    TSExternalModuleReference: ({ expression }) => found.push(expression.value),
    NewExpression({ callee, arguments: [address, base] }) {
      if (callee.type !== 'Identifier' || callee.name !== 'URL' || !isOwnAddress(base)) return;
      found.push(textOf(address));
    },
  }).visit(program);
  return found;
}
