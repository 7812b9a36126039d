import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { DrawingPage } from '@/components/drawing/drawing-page';

export const metadata: Metadata = { title: 'Drawing' };

export default async function LayoutPage({ params }: { params: Promise<{ layoutId: string }> }) {
  const { layoutId } = await params;
  return signedInPage(`/layouts/${layoutId}`, () => <DrawingPage layoutId={layoutId} />);
}
