import { describe, expect, test } from 'vitest';
import type { GroundSave, LayoutSave } from '@/lib/api';
import { Problem } from '@/lib/client/api/problem';
import { BACK_OFF_MS, SAVE_AFTER_MS, startSaving } from '@/lib/client/saving/save-queue';
import type { Layout, SiteGround } from '@/lib/layout';
import { drawingOn } from './drawing-on';

/** A server that compares versions as the real one does, and can be told to fail. */
function server() {
  const held = {
    layout: null as Layout | null,
    version: 1,
    ground: null as SiteGround | null,
    groundVersion: 1,
  };
  const labels: string[] = [];
  let failing: (() => Problem)[] = [];
  let losing = false;
  const timers: { work: () => void; ms: number }[] = [];
  const refuse = (): void => {
    const problem = failing.shift();
    if (problem) throw problem();
  };
  const at = (): string => '2031-05-04T14:02:00.000Z';
  const stale = (current: unknown): Problem =>
    new Problem('stale', 412, 'Someone saved a newer version.', {
      type: 'x',
      title: 'x',
      status: 412,
      detail: 'x',
      code: 'stale',
      current,
    });
  return {
    held,
    labels,
    timers,
    failNext: (...problems: (() => Problem)[]) => (failing = problems),
    /** The next save arrives, but its answer does not. */
    loseNextAnswer: () => (losing = true),
    /** Runs what waits, as time would. */
    tick: async () => {
      const due = timers.splice(0);
      due.forEach(({ work }) => work());
      await new Promise((done) => setTimeout(done, 0));
      return due.map(({ ms }) => ms);
    },
    sending: {
      async putLayout(version: number, { layout, label }: LayoutSave) {
        refuse();
        if (version !== held.version) {
          throw stale({
            version: held.version,
            layout: held.layout,
            saved_at: at(),
            saved_by: null,
          });
        }
        held.layout = structuredClone(layout);
        held.version++;
        labels.push(label);
        if (losing) {
          losing = false;
          throw offline();
        }
        return { version: held.version, saved_at: at() };
      },
      async putGround(version: number, { ground }: GroundSave) {
        refuse();
        if (version !== held.groundVersion) {
          throw stale({
            version: held.groundVersion,
            ground: held.ground,
            saved_at: at(),
            saved_by: null,
          });
        }
        held.ground = structuredClone(ground);
        held.groundVersion++;
        return { version: held.groundVersion, saved_at: at() };
      },
      later(work: () => void, ms: number) {
        const timer = { work, ms };
        timers.push(timer);
        return () => timers.splice(timers.indexOf(timer), timers.includes(timer) ? 1 : 0);
      },
    },
  };
}

const offline = (): Problem => new Problem('offline', 0, 'The server can’t be reached.');
const away = (): Problem => new Problem('database-away', 503, 'The database is away.');
const signedOut = (): Problem => new Problem('signed-out', 401, 'You are signed out.');
const named = (name: string) => ({ type: 'set-layout', members: { name } }) as const;
const answered = { type: 'set-ground', answers: { electric: { answer: 'clear' } } } as const;

describe('saving', () => {
  test('a change is sent within a second, against the version last confirmed', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    store.getState().apply(named('B'), 'Set name');
    expect(store.getState().save.status).toBe('unsaved');
    expect(SAVE_AFTER_MS).toBeLessThanOrEqual(1000);
    expect(await it.tick()).toEqual([SAVE_AFTER_MS]);
    expect(it.held.layout?.name).toBe('B');
    expect(store.getState().base.layoutVersion).toBe(2);
    expect(store.getState().save).toMatchObject({
      status: 'saved',
      at: '2031-05-04T14:02:00.000Z',
    });
    expect(it.timers).toEqual([]);
  });

  test('many changes become one save, named after the last and how many more', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    for (const name of ['B', 'C', 'D']) store.getState().apply(named(name), `Name it ${name}`);
    expect(it.timers).toHaveLength(1);
    await it.tick();
    expect(it.labels).toEqual(['Name it D and 2 more']);
    expect(it.held.version).toBe(2);
  });

  test('undoing back to what is saved leaves nothing to save', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    store.getState().apply(named('B'), 'Set name');
    store.getState().undo();
    expect(store.getState().save.status).toBe('saved');
    await it.tick();
    expect(it.labels).toEqual([]);
  });

  test('undoing past a save is itself saved', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    store.getState().apply(named('B'), 'Name it B');
    await it.tick();
    store.getState().undo();
    await it.tick();
    expect(it.held.layout?.name).toBe('Plan A');
    expect(it.labels).toEqual(['Name it B', 'Undo Name it B']);
  });

  test('the ground is saved on its own, by its own version', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    store.getState().apply(answered, 'Record answer');
    await it.tick();
    expect(it.held).toMatchObject({ version: 1, groundVersion: 2 });
    expect(store.getState().base).toMatchObject({ layoutVersion: 1, groundVersion: 2 });
    expect(store.getState().save.status).toBe('saved');
  });

  test('what changes while a save is on its way is sent next', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    store.getState().apply(named('B'), 'Set name');
    it.timers.splice(0).forEach(({ work }) => work());
    store.getState().apply(named('C'), 'Set name');
    await new Promise((done) => setTimeout(done, 0));
    expect(store.getState().save.status).toBe('unsaved');
    await it.tick();
    expect(it.held).toMatchObject({ version: 3, layout: { name: 'C' } });
    expect(store.getState().save.status).toBe('saved');
  });

  test('without a connection it keeps drawing, tries again ever later, and saves in the end', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    it.failNext(offline, away, offline);
    store.getState().apply(named('B'), 'Set name');
    await it.tick();
    expect(store.getState().save).toMatchObject({
      status: 'offline',
      words: 'No connection, kept in this browser',
    });
    expect(await it.tick()).toEqual([BACK_OFF_MS[0]]);
    expect(store.getState().save.status).toBe('failed');
    expect(store.getState().save.words).toContain('The database is away.');
    store.getState().apply(named('C'), 'Set name');
    expect(await it.tick()).toEqual([BACK_OFF_MS[1]]);
    expect(await it.tick()).toEqual([BACK_OFF_MS[2]]);
    expect(it.held.layout?.name).toBe('C');
    expect(store.getState().save.status).toBe('saved');
  });

  test('signed out in mid-edit: nothing is lost, and it saves after sign-in', async () => {
    const store = drawingOn();
    const it = server();
    const queue = startSaving(store, it.sending);
    it.failNext(signedOut);
    store.getState().apply(named('B'), 'Set name');
    await it.tick();
    expect(store.getState().save.status).toBe('signed-out');
    expect(store.getState().history.present.layout.name).toBe('B');
    await queue.retry();
    expect(it.held.layout?.name).toBe('B');
    expect(it.timers).toEqual([]);
  });

  test('a save whose answer was lost is recognised as ours, not taken for somebody else’s', async () => {
    const store = drawingOn();
    const it = server();
    const queue = startSaving(store, it.sending);
    it.loseNextAnswer();
    store.getState().apply(named('B'), 'Set name');
    await it.tick();
    expect(it.held.version).toBe(2);
    store.getState().apply(named('C'), 'Set name');
    await it.tick();
    expect(queue.stale()).toBeNull();
    await it.tick();
    expect(it.held).toMatchObject({ version: 3, layout: { name: 'C' } });
    expect(store.getState().save.status).toBe('saved');
  });

  test('a refusal that trying again cannot mend waits for the next change', async () => {
    const store = drawingOn();
    const it = server();
    startSaving(store, it.sending);
    it.failNext(() => new Problem('too-large', 413, 'The layout is too large.'));
    store.getState().apply(named('B'), 'Set name');
    await it.tick();
    expect(store.getState().save.status).toBe('failed');
    expect(it.timers).toEqual([]);
    store.getState().apply(named('C'), 'Set name');
    await it.tick();
    expect(it.held.layout?.name).toBe('C');
  });
});

describe('a stale save', () => {
  async function collided() {
    const store = drawingOn();
    const it = server();
    const queue = startSaving(store, it.sending);
    const theirs = { ...store.getState().sheet.layout, name: 'Theirs' };
    Object.assign(it.held, { layout: theirs, version: 2 });
    store.getState().apply(named('Mine'), 'Set name');
    await it.tick();
    return { store, it, queue };
  }

  test('keeps both and asks; nothing more is sent meanwhile', async () => {
    const { store, it, queue } = await collided();
    expect(store.getState().save.status).toBe('stale');
    expect(queue.stale()).toMatchObject({ what: 'layout', theirs: { layout: { name: 'Theirs' } } });
    expect(store.getState().history.present.layout.name).toBe('Mine');
    store.getState().apply(named('Mine too'), 'Set name');
    await it.tick();
    expect(it.held.layout?.name).toBe('Theirs');
    expect(store.getState().save.status).toBe('stale');
  });

  test('mine over theirs is saved as a newer version', async () => {
    const { store, it, queue } = await collided();
    await queue.keepMine();
    expect(it.held).toMatchObject({ version: 3, layout: { name: 'Mine' } });
    expect(queue.stale()).toBeNull();
    expect(store.getState().save.status).toBe('saved');
  });

  test('taking theirs puts it under the drawing, with nothing to save', async () => {
    const { store, it, queue } = await collided();
    queue.takeTheirs();
    expect(store.getState().sheet.layout.name).toBe('Theirs');
    expect(store.getState().save.status).toBe('saved');
    store.getState().apply(named('Next'), 'Set name');
    await it.tick();
    expect(it.held).toMatchObject({ version: 3, layout: { name: 'Next' } });
  });
});
