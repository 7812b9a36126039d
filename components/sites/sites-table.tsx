import Link from 'next/link';
import { When } from '@/components/ui/when';
import type { SiteRow } from '@/lib/api';

export function SitesTable({ sites }: { sites: readonly SiteRow[] }) {
  return (
    <table className="mt-2 w-full border-collapse border-t-2 border-ink text-left">
      <thead className="text-sm text-ink-soft">
        <tr className="border-b border-ink">
          <th scope="col" className="py-1.5 pr-4 font-normal">
            Site
          </th>
          <th scope="col" className="py-1.5 pr-4 text-right font-normal">
            Layouts
          </th>
          <th scope="col" className="py-1.5 font-normal max-md:hidden">
            Last changed
          </th>
        </tr>
      </thead>
      <tbody>
        {sites.map((site) => (
          <tr key={site.id} className="border-b border-rule-faint align-baseline">
            <th scope="row" className="py-1 pr-4 font-normal">
              <Link
                href={`/sites/${site.id}`}
                className="inline-flex min-h-11 items-center text-lg font-bold underline decoration-1 underline-offset-4 hover:decoration-2"
              >
                {site.name}
              </Link>
              <span className="block pb-1">{site.where ?? 'place not entered'}</span>
              <span className="block pb-1 text-sm text-ink-soft md:hidden">
                <When at={site.changed_at} />
              </span>
            </th>
            <td className="py-1 pr-4 text-right text-lg">{site.layouts}</td>
            <td className="py-1 max-md:hidden">
              <When at={site.changed_at} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
