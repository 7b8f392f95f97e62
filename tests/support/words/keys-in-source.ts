import { readdirSync, readFileSync } from 'node:fs';
import ts from 'typescript';
import en from '../../../shared/locales/en';

/** A message key as it stands in the source, with the params that are given beside it where that can be seen. */
export interface KeyInSource {
  key: string;
  file: string;
  /** null: they are put together elsewhere */
  params: readonly string[] | null;
}

const filesUnder = (folder: string): string[] =>
  readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = `${folder}/${entry.name}`;
    if (entry.isDirectory()) return path === 'shared/locales/en' ? [] : filesUnder(path);
    return /\.(ts|vue)$/.test(path) ? [path] : [];
  });

const sources = ['src', 'shared', 'server']
  .flatMap(filesUnder)
  .map((file) => ({ file, code: readFileSync(file, 'utf8') }));

const areas = Object.keys(en).join('|');
const literal = new RegExp(`'((?:${areas})\\.[A-Za-z0-9_.-]+)'`, 'g');
const template = new RegExp(`\`((?:${areas})\\.[^\`\\s]*\\$\\{[^\`]*)\``, 'g');

/** Names that look like keys and are none: permissions, columns of a table, the browser's own store. */
const noKey =
  /^(job\.command\.|job\.\$\{by\}|job\.(read|plan|list|id|search)\b|jobs\.id$|packet\.|desk\.read$|account\.(self|id)$|plan\.\$\{accountId\})/;

const isMessageKey = (key: string): boolean => !noKey.test(key);

/** Every key written out anywhere. */
export const literalKeys = (): Omit<KeyInSource, 'params'>[] =>
  sources.flatMap(({ file, code }) =>
    [...code.matchAll(literal)].map((match) => ({ file, key: match[1] ?? '' })).filter(({ key }) => isMessageKey(key)),
  );

/** Every key with something put in, as `job.datum.${…}`. */
export const templateKeys = (): Omit<KeyInSource, 'params'>[] =>
  sources.flatMap(({ file, code }) =>
    [...code.matchAll(template)]
      .map((match) => ({ file, key: (match[1] ?? '').replace(/\$\{[^}]*\}/g, '${…}'), raw: match[1] ?? '' }))
      .filter(({ raw }) => isMessageKey(raw))
      .map(({ file: where, key }) => ({ file: where, key })),
  );

/** The text from an opening bracket to the one that closes it. */
const bracketed = (code: string, from: number): string => {
  let depth = 0;
  let quote = '';
  for (let at = from; at < code.length; at++) {
    const sign = code.charAt(at);
    if (quote !== '') quote = sign === quote ? '' : quote;
    else if (`'\`"`.includes(sign)) quote = sign;
    else if ('({['.includes(sign)) depth++;
    else if (')}]'.includes(sign) && --depth === 0) return code.slice(from, at + 1);
  }
  return '';
};

const namesIn = (node: ts.Expression | undefined): readonly string[] | null => {
  if (node === undefined) return [];
  if (!ts.isObjectLiteralExpression(node)) return null;
  const names = node.properties.map((one) => (one.name && ts.isIdentifier(one.name) ? one.name.text : null));
  return names.every((name) => name !== null) ? names : null;
};

const keysIn = (node: ts.Expression | undefined): string[] => {
  if (node === undefined) return [];
  if (ts.isStringLiteralLike(node)) return [node.text];
  return ts.isConditionalExpression(node) ? [...keysIn(node.whenTrue), ...keysIn(node.whenFalse)] : [];
};

const expressionOf = (code: string): ts.Expression | undefined => {
  const [statement] = ts.createSourceFile('one.ts', `(${code})`, ts.ScriptTarget.Latest).statements;
  if (statement === undefined || !ts.isExpressionStatement(statement)) return undefined;
  return ts.isParenthesizedExpression(statement.expression) ? statement.expression.expression : undefined;
};

const calls = /\b(?:say|text)\(/g;
const objects = /\{\s*key:/g;

const inCall = (file: string, code: string): KeyInSource[] => {
  const call = expressionOf(`f${code}`);
  if (call === undefined || !ts.isCallExpression(call)) return [];
  return keysIn(call.arguments[0]).map((key) => ({ key, file, params: namesIn(call.arguments[1]) }));
};

const inObject = (file: string, code: string): KeyInSource[] => {
  const made = expressionOf(code);
  if (made === undefined || !ts.isObjectLiteralExpression(made)) return [];
  const of = (name: string): ts.PropertyAssignment | undefined =>
    made.properties.filter(ts.isPropertyAssignment).find((one) => ts.isIdentifier(one.name) && one.name.text === name);
  const shorthand = made.properties.some(ts.isShorthandPropertyAssignment);
  const params = shorthand ? null : namesIn(of('params')?.initializer);
  return keysIn(of('key')?.initializer).map((key) => ({ key, file, params }));
};

/** Keys together with the names of what is put into their sentences. */
export const keysWithParams = (): KeyInSource[] =>
  sources
    .flatMap(({ file, code }) => [
      ...[...code.matchAll(calls)].flatMap((match) => inCall(file, bracketed(code, match.index + match[0].length - 1))),
      ...[...code.matchAll(objects)].flatMap((match) => inObject(file, bracketed(code, match.index))),
    ])
    .filter(({ key }) => new RegExp(`^(${areas})\\.`).test(key) && isMessageKey(key));

const problemCode = /(?:new Problem\(\d+, |turned\(\d+, |code: )'([a-z-]+\.[a-z-]+)'/g;

/** Codes under which the server answers that it did not do it. */
export const problemCodes = (): string[] =>
  sources
    .filter(({ file }) => file.startsWith('server/'))
    .flatMap(({ code }) => [...code.matchAll(problemCode)].map((match) => match[1] ?? ''));
