import type { KitAnswer } from '@/lib/api';
import type { KitKind } from '@/lib/layout';

const KIND_WORDS: Record<KitKind, string> = {
  rod: 'Rod',
  coupler: 'Coupler',
  jumper: 'Jumper',
  'ground-cable': 'Ground cable',
  'bond-cable': 'Bond cable',
  clamp: 'Clamp',
  probe: 'Probe',
  tester: 'Tester',
  'test-lead': 'Test lead',
  hose: 'Hose',
  driver: 'Driver',
};

export function KitTable({ kit }: { kit: KitAnswer }) {
  return (
    <section className="min-w-0">
      <h2 className="border-b-2 border-ink text-lg font-bold">{kit.name}</h2>
      <table className="w-full border-collapse text-left">
        <thead className="text-sm text-ink-soft">
          <tr className="border-b border-rule">
            <th scope="col" className="py-1 pr-4 font-normal">
              Item
            </th>
            <th scope="col" className="py-1 pr-4 text-right font-normal">
              Length, ft
            </th>
            <th scope="col" className="py-1 pr-4 text-right font-normal">
              Diameter, in
            </th>
            <th scope="col" className="py-1 text-right font-normal">
              Count
            </th>
          </tr>
        </thead>
        <tbody>
          {kit.items.map((item, index) => (
            <tr key={index} className="border-b border-rule-faint">
              <th scope="row" className="py-1.5 pr-4 font-semibold">
                {KIND_WORDS[item.kind]}
              </th>
              <td className="py-1.5 pr-4 text-right">{item.length_ft ?? '–'}</td>
              <td className="py-1.5 pr-4 text-right">{item.diameter_in ?? '–'}</td>
              <td className="py-1.5 text-right text-lg font-bold">{item.count}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
