'use client';

import { DESK, PHONE, useMedia } from '../use-media';
import { DeskSheet } from './desk-sheet';
import { PhoneSheet } from './phone-sheet';
import { TabletSheet } from './tablet-sheet';

/** The drawing as the window has room for it: the same parts, seated differently. */
export function Sheet() {
  const desk = useMedia(DESK);
  const phone = useMedia(PHONE);
  if (desk) return <DeskSheet />;
  return phone ? <PhoneSheet /> : <TabletSheet />;
}
