import { ESLint } from 'eslint';

/** Reads [[file, code], …] from standard input and prints, for each, the errors that ESLint finds as if it stood there. */
let given = '';
for await (const chunk of process.stdin) given += chunk;
const eslint = new ESLint();
const found = [];
for (const [filePath, code] of JSON.parse(given)) {
  const [result] = await eslint.lintText(`${code}\n`, { filePath });
  found.push(
    result.messages
      .filter((message) => message.severity === 2 && /restricted|explicit-any/.test(message.ruleId ?? ''))
      .map((message) => message.message),
  );
}
process.stdout.write(JSON.stringify(found));
