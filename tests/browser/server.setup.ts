import type { TestProject } from 'vitest/node';
import { serveBuild, type SignIn } from './support/serve-build';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Of the served production build, without a slash at its end. */
    address: string;
    /** The demo's people. */
    signIns: SignIn[];
  }
}

/** One server for all browser tests of a run, gone again after them. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { address, signIns, stop } = await serveBuild('the browser tests', 'test/browser');
  project.provide('address', address);
  project.provide('signIns', signIns);
  return stop;
}
