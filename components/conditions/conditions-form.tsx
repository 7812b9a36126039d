'use client';

import { Select } from '@/components/ui/field';
import {
  degreesToGrade,
  gradeToDegrees,
  speedFromMph,
  speedToMph,
  type SpeedUnit,
} from '@/lib/geo';
import type { Edit } from '@/lib/edits';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import type { Conditions } from '@/lib/layout';
import { slopeEdit, soilEdit, windEdit } from './condition-edits';
import { degreesWords, speedWords, steepnessWords, type SteepnessUnit } from './condition-words';
import { NumberEntry } from './number-entry';
import { TimeEntry } from './time-entry';
import { clockWords } from './time-words';
import { SPEED_UNITS, STEEPNESS_UNITS, useSpeedUnit, useSteepnessUnit } from './units';

type Enter = (edit: (before: Conditions) => Edit, label: string) => void;

/** Builds on what is present when called, so that fields left one after the other don't undo each other. */
export function useEnterCondition(): Enter {
  const store = useDrawingStore();
  return (edit, label) => {
    const { history, apply } = store.getState();
    apply(edit(history.present.layout.conditions), label);
  };
}

/** Every condition by typing. An emptied field is "not entered". */
export function ConditionsForm() {
  return (
    <div className="grid grid-cols-2 gap-x-3 gap-y-2 pt-3">
      <WindFields />
      <SlopeFields />
      <SoilField />
    </div>
  );
}

export function WindFields() {
  const wind = useDrawing((s) => s.sheet.layout.conditions.wind);
  const disabled = !useDrawing((s) => s.canDraw);
  const [unit, chooseUnit] = useSpeedUnit();
  const enter = useEnterCondition();
  return (
    <>
      <NumberEntry
        label="Wind from"
        unit="°"
        value={wind?.from_deg}
        decimals={0}
        least={0}
        most={360}
        disabled={disabled}
        onEnter={(degrees) =>
          enter(
            (before) => windEdit(before, { from_deg: degrees }),
            degrees === null ? 'Wind direction not known' : `Wind from ${degreesWords(degrees)}`,
          )
        }
      />
      <NumberEntry
        label="Swings ±"
        unit="°"
        value={wind?.swing_deg}
        decimals={0}
        least={0}
        most={180}
        disabled={disabled}
        onEnter={(swing) =>
          enter(
            (before) => windEdit(before, { swing_deg: swing }),
            swing === null ? 'Wind swing not known' : `Wind swings ±${swing}°`,
          )
        }
      />
      <NumberEntry
        label="Speed"
        className="col-span-2"
        unit={
          <UnitChoice unit={unit} units={SPEED_UNITS} name="Unit of speed" onChoose={chooseUnit} />
        }
        value={wind?.speed_mph == null ? null : speedFromMph(wind.speed_mph, unit)}
        decimals={1}
        least={0}
        most={Math.floor(speedFromMph(300, unit))}
        disabled={disabled}
        onEnter={(speed) => enterSpeed(enter, speed, unit)}
      />
      <SeenField />
    </>
  );
}

function enterSpeed(enter: Enter, speed: number | null, unit: SpeedUnit): void {
  const mph = speed === null ? null : speedToMph(speed, unit);
  const words = speedWords({ speed_mph: mph }, unit);
  enter(
    (before) => windEdit(before, { speed_mph: mph }),
    words ? `Wind ${words}` : 'Wind speed not known',
  );
}

export function SeenField() {
  const observedAt = useDrawing((s) => s.sheet.layout.conditions.wind?.observed_at ?? null);
  const disabled = !useDrawing((s) => s.canDraw);
  const enter = useEnterCondition();
  const see = (at: string | null): void =>
    enter(
      (before) => windEdit(before, { observed_at: at }),
      at === null ? 'Wind not seen' : `Wind seen ${clockWords(at, at)}`,
    );
  return (
    <TimeEntry
      label="Wind seen at"
      className="col-span-2"
      value={observedAt}
      disabled={disabled}
      onEnter={see}
    />
  );
}

export function SlopeFields() {
  const slope = useDrawing((s) => s.sheet.layout.conditions.slope);
  const disabled = !useDrawing((s) => s.canDraw);
  const [unit, chooseUnit] = useSteepnessUnit();
  const enter = useEnterCondition();
  const grade = slope?.grade_pct;
  return (
    <>
      <NumberEntry
        label="Downhill to"
        unit="°"
        value={slope?.down_deg}
        decimals={0}
        least={0}
        most={360}
        disabled={disabled}
        onEnter={(degrees) =>
          enter(
            (before) => slopeEdit(before, { down_deg: degrees }),
            degrees === null ? 'Downhill not known' : `Downhill to ${degreesWords(degrees)}`,
          )
        }
      />
      <NumberEntry
        label="Steepness"
        unit={
          <UnitChoice
            unit={unit}
            units={STEEPNESS_UNITS}
            name="Unit of steepness"
            onChoose={chooseUnit}
          />
        }
        value={grade == null ? null : unit === '%' ? grade : gradeToDegrees(grade)}
        decimals={1}
        least={0}
        most={unit === '%' ? 1000 : 84}
        disabled={disabled}
        onEnter={(steepness) => enterSteepness(enter, steepness, unit)}
      />
    </>
  );
}

function enterSteepness(enter: Enter, steepness: number | null, unit: SteepnessUnit): void {
  const grade =
    steepness === null
      ? null
      : unit === '%'
        ? steepness
        : Math.min(1000, degreesToGrade(steepness));
  enter(
    (before) => slopeEdit(before, { grade_pct: grade }),
    grade === null ? 'Steepness not known' : `Steepness ${steepnessWords(grade, unit)}`,
  );
}

function SoilField() {
  const soil = useDrawing((s) => s.sheet.layout.conditions.soil);
  const disabled = !useDrawing((s) => s.canDraw);
  const enter = useEnterCondition();
  return (
    <NumberEntry
      label="Soil"
      unit="Ω·m"
      className="col-span-2"
      value={soil?.resistivity_ohm_m}
      least={0.01}
      most={1e7}
      disabled={disabled}
      onEnter={(ohmMetres) =>
        enter(
          // A new likely value leaves no meaning to bounds that were entered for another.
          (before) =>
            soilEdit(before, {
              resistivity_ohm_m: ohmMetres,
              low_ohm_m: null,
              high_ohm_m: null,
              source: ohmMetres === null ? null : 'entered',
            }),
          ohmMetres === null ? 'Soil not known' : `Soil ${ohmMetres} Ω·m`,
        )
      }
    />
  );
}

function UnitChoice<T extends string>({
  unit,
  units,
  name,
  onChoose,
}: {
  unit: T;
  units: readonly T[];
  name: string;
  onChoose: (unit: T) => void;
}) {
  return (
    <Select
      aria-label={name}
      className="!w-[4.75rem] shrink-0 !px-1 !py-1"
      value={unit}
      onChange={(event) => {
        const chosen = units.find((one) => one === event.target.value);
        if (chosen) onChoose(chosen);
      }}
    >
      {units.map((one) => (
        <option key={one}>{one}</option>
      ))}
    </Select>
  );
}
