import ts from 'typescript';
import { nodesOf, parsed, sourcesUnder } from './source-files';

const sources = sourcesUnder(['app', 'components', 'server', 'shared']);
const screens = [...sources].filter(
  ([path]) => /^(app|components)\//.test(path) && !/^components\/(gallery|theme)\//.test(path),
);
const catalogue = [...sources].filter(([path]) => path.startsWith('shared/text/en/'));

/** Names that code reads: `words.count`, `words['on the way']`, `{ count } = words`, a code of a contract. */
function namesRead(file: ts.SourceFile): string[] {
  return [...nodesOf(file)].flatMap((node) => {
    if (ts.isPropertyAccessExpression(node)) return [node.name.text];
    if (ts.isBindingElement(node)) return [(node.propertyName ?? node.name).getText()];
    if (!ts.isStringLiteral(node)) return [];
    return ts.isPropertyAssignment(node.parent) && node.parent.name === node ? [] : [node.text];
  });
}

function keysOf(file: ts.SourceFile): string[] {
  return [...nodesOf(file)].flatMap((node) =>
    ts.isPropertyAssignment(node) || ts.isShorthandPropertyAssignment(node)
      ? [ts.isIdentifier(node.name) || ts.isStringLiteral(node.name) ? node.name.text : node.name.getText()]
      : [],
  );
}

/** Words for people that stand in the markup itself: between tags, or in an attribute. */
function sentencesIn(file: ts.SourceFile): string[] {
  return [...nodesOf(file)].flatMap((node) => {
    if (ts.isJsxText(node)) return /\p{L}{2}/u.test(node.text) ? [node.text.trim()] : [];
    if (!ts.isJsxAttribute(node) || !node.initializer || !ts.isStringLiteral(node.initializer)) return [];
    const isForPeople = /^(title|label|hint|lead|placeholder|alt|note|summary|aria-label)$|Label$/.test(
      node.name.getText(),
    );
    return isForPeople && /\p{L}{2}/u.test(node.initializer.text) ? [node.initializer.text] : [];
  });
}

function coloursIn(file: ts.SourceFile): string[] {
  return [...nodesOf(file)].flatMap((node) =>
    ts.isStringLiteralLike(node) && /^#[0-9a-f]{3,8}$|\b(rgba?|hsla?|oklch)\(/i.test(node.text)
      ? [node.text]
      : [],
  );
}

const foundIn = (find: (file: ts.SourceFile) => string[]) =>
  screens.flatMap(([path, file]) => find(file).map((found) => `${path}: ${found}`));

describe('texts and colours', () => {
  it('of the catalogue are all read somewhere', () => {
    const read = new Set([...sources.values()].flatMap(namesRead));
    const keys = catalogue.flatMap(([path, file]) => keysOf(file).map((key) => [path, key] as const));
    expect(keys.length).toBeGreaterThan(500);
    expect(keys.filter(([, key]) => !read.has(key))).toEqual([]);
  });

  it('for people come from the catalogue, not from the markup', () => {
    expect(screens.length).toBeGreaterThan(100);
    expect(foundIn(sentencesIn)).toEqual([]);
  });

  it('are named by their meaning outside the theme', () => {
    expect(foundIn(coloursIn)).toEqual([]);
  });

  it('are found where they do not belong', () => {
    const wrong = parsed(
      'Wrong.tsx',
      'export const Wrong = () => <A label="Send" color="#fff">Count it</A>;',
    );
    expect(sentencesIn(wrong)).toEqual(['Send', 'Count it']);
    expect(coloursIn(wrong)).toEqual(['#fff']);
    expect(keysOf(parsed('en.ts', "export const a = { unread: 'x' };"))).toEqual(['unread']);
    expect(namesRead(parsed('en.ts', "export const a = { unread: 'x' };"))).not.toContain('unread');
  });
});
