'use client';

import { Select } from '@/components/ui/field';
import { NumberEntry } from '@/components/conditions/number-entry';
import { useStoredChoice } from '@/components/conditions/use-stored-choice';
import { celsiusToFahrenheit, fahrenheitToCelsius } from '@/lib/geo';
import { useDrawing } from '@/lib/client/use-drawing';
import { TextEntry } from './text-entry';
import { useSetLiquid } from './use-set-layout';

const SCALES = ['°F', '°C'] as const;
type Scale = (typeof SCALES)[number];

/** What the shipping paper says of the liquid. */
export function LiquidFields() {
  const liquid = useDrawing((s) => s.sheet.layout.liquid);
  const disabled = !useDrawing((s) => s.canDraw);
  const set = useSetLiquid();
  const [scale, chooseScale] = useStoredChoice<Scale>('stillground.temperature', SCALES, '°F');
  const shown = (celsius: number | null | undefined): number | null =>
    celsius == null ? null : scale === '°C' ? celsius : celsiusToFahrenheit(celsius);
  const kept = (degrees: number | null): number | null =>
    degrees === null || scale === '°C' ? degrees : fahrenheitToCelsius(degrees);
  const least = scale === '°C' ? -273 : -459;

  return (
    <div className="grid grid-cols-2 gap-x-3 gap-y-1">
      <TextEntry
        label="Liquid"
        value={liquid?.name}
        most={500}
        disabled={disabled}
        onEnter={(name) => set({ name }, name ? `Liquid is ${name}` : 'Liquid not known')}
      />
      <TextEntry
        label="UN number"
        value={liquid?.un}
        most={20}
        disabled={disabled}
        onEnter={(un) => set({ un }, un ? `Liquid is UN ${un}` : 'UN number not known')}
      />
      <NumberEntry
        label="Flash point"
        unit={
          <Select
            aria-label="Temperature scale"
            className="!w-16 !px-1 !py-1"
            value={scale}
            onChange={(event) => chooseScale(event.target.value === '°C' ? '°C' : '°F')}
          >
            {SCALES.map((one) => (
              <option key={one}>{one}</option>
            ))}
          </Select>
        }
        value={shown(liquid?.flash_point_c)}
        decimals={1}
        least={least}
        most={2000}
        disabled={disabled}
        onEnter={(degrees) => set({ flash_point_c: kept(degrees) }, 'Flash point')}
      />
      <NumberEntry
        label="Boiling point"
        unit={scale}
        value={shown(liquid?.boiling_point_c)}
        decimals={1}
        least={least}
        most={5000}
        disabled={disabled}
        onEnter={(degrees) => set({ boiling_point_c: kept(degrees) }, 'Boiling point')}
      />
    </div>
  );
}
