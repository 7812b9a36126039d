import { redirect } from 'next/navigation';

/** The handout under the name that people type. */
export default async function PrintPage({ params }: { params: Promise<{ layoutId: string }> }) {
  redirect(`/layouts/${(await params).layoutId}/handout`);
}
