import { LIMIT_TABLE, type LimitEntry, type LimitKey, type LimitValues } from '@/lib/limits';
import { BackingWords } from './backing-words';
import { limitGroups, limitWords } from './groups';

/** Each limit with its value, the default where it differs, its mark and its source. */
export function LimitTables({ values }: { values: LimitValues }) {
  return limitGroups().map((group) => (
    <section key={group.title} className="mt-8 min-w-0">
      <h2 className="border-b-2 border-ink text-lg font-bold">{group.title}</h2>
      <dl>
        {group.keys.map((key) => (
          <LimitLine key={key} name={key} entry={LIMIT_TABLE[key]} value={values[key]} />
        ))}
      </dl>
    </section>
  ));
}

function LimitLine({ name, entry, value }: { name: LimitKey; entry: LimitEntry; value: number }) {
  const own = value !== entry.value;
  return (
    <div
      id={name}
      className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-6 border-b border-rule-faint py-2 md:grid-cols-[minmax(0,2fr)_9rem_minmax(0,3fr)]"
    >
      <dt className="font-semibold">{entry.title}</dt>
      <dd className="whitespace-nowrap text-right text-lg font-bold leading-6">
        {limitWords(value, entry.unit)}
        {own && (
          <span className="block text-base font-normal">
            default {limitWords(entry.value, entry.unit)}
          </span>
        )}
      </dd>
      <dd className="text-ink-soft max-md:col-span-2">
        {own && <span className="text-ink">Set by the agency. Default: </span>}
        <BackingWords backing={entry} />
      </dd>
    </div>
  );
}
