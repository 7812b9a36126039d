import { mkdir, writeFile } from 'node:fs/promises';
import { format, resolveConfig } from 'prettier';
import { demoFiles } from './demo-files';

/** Writes the demonstration's exchange files anew: `npx tsx demo/make-demo.ts`. */
async function main(): Promise<void> {
  const style = await resolveConfig('demo/files/any.json');
  await mkdir('demo/files', { recursive: true });
  for (const { path, content } of demoFiles()) {
    await writeFile(path, await format(JSON.stringify(content), { ...style, parser: 'json' }));
    process.stdout.write(`${path}\n`);
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
