import { caseJsonSchema } from '../../physics/case/index.js';

/** The parts of a JSON Schema that the case file's uses. */
interface Node {
  readonly description?: string;
  readonly default?: unknown;
  readonly properties?: Readonly<Record<string, Node>>;
  readonly required?: readonly string[];
  readonly items?: Node;
  readonly anyOf?: readonly Node[];
  readonly oneOf?: readonly Node[];
}

interface Key {
  readonly path: string;
  readonly unlessSaid: string;
  readonly meaning: string;
}

/** Every key of the case file, as a table for the page that explains it. */
export const caseKeyTable = (): string => {
  const keys = keysBelow(caseJsonSchema() as Node, '');
  const seen = new Map(keys.map((key) => [`${key.path} ${key.meaning}`, key]));
  const rows = [...seen.values()].map(
    ({ path, unlessSaid, meaning }) => `| \`${path}\` | ${unlessSaid} | ${meaning} |`,
  );
  return ['| key | unless said | meaning |', '|---|---|---|', ...rows].join('\n');
};

/** The page with the table under its last heading put in place of what stands there. */
export const withCaseKeys = (page: string): string =>
  `${page.split(/\n\|/)[0].trimEnd()}\n\n${caseKeyTable()}\n`;

const keysBelow = (node: Node, path: string): Key[] => [
  ...Object.entries(node.properties ?? {}).flatMap(([key, child]) => {
    const at = path === '' ? key : `${path}.${key}`;
    const isRequired = node.required?.includes(key) ?? false;
    return [
      {
        path: at,
        unlessSaid: isRequired ? '–' : defaultWords(child),
        meaning: child.description ?? '',
      },
      ...keysBelow(child, at),
    ];
  }),
  ...[...(node.anyOf ?? []), ...(node.oneOf ?? [])].flatMap((child) => keysBelow(child, path)),
  ...(node.items ? keysBelow(node.items, `${path}[]`) : []),
];

/** An object whose keys have defaults of their own needs none. */
const defaultWords = ({ default: value, properties }: Node): string =>
  value === undefined || (properties && JSON.stringify(value) === '{}')
    ? ''
    : `\`${JSON.stringify(value)}\``;
