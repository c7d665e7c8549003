import { stampText } from '../../core/stampText.ts';
import { type OffsetSpan, zoneOffsets } from '../../core/zoneOffsets.ts';
import type { ReadSettings, StampClock } from '../readSettings.ts';
import type { Findings } from './findings.ts';
import { irregularRows, keepsLocalClock, type LocalClock, localToStandard } from './localClock.ts';
import { rangeOf } from './rangeOf.ts';
import type { Stamps } from './stampFields.ts';
import { type RowOrder, strideOf } from './timeStep.ts';

/** The rows in standard time: where each one's step begins. */
export interface StandardTime {
  /** Minutes since 1970-01-01 00:00 of standard time at the beginning of each step; NaN where not known. */
  readonly minutes: Float64Array;
  /** Standard time less UTC, minutes. */
  readonly offsetMinutes: number;
  readonly offsetFrom: 'settings' | 'stamps' | 'header' | 'zone' | 'site';
  readonly clock: StampClock;
  readonly clockFrom: 'settings' | 'recognised' | 'assumed';
}

/** What the conversion needs to know. */
export interface ClockSource {
  readonly stamps: Stamps;
  readonly order: RowOrder;
  /** Whether stamps mark the end of their step. */
  readonly atEnd: boolean;
  readonly settings: ReadSettings;
  readonly zone: string | undefined;
  readonly defaultOffsetMinutes: number;
  /** Offset that the header of the stamps names. */
  readonly headerOffset: number | undefined;
  /** Physical line of each row. */
  readonly lines: Int32Array;
  readonly findings: Findings;
}

const TWO_DAYS = 2880;

/**
 * Converts stamps to standard time at the beginning of their step.
 *
 * @returns nothing where the clock cannot be converted, which is a problem
 */
export function toStandardTime(source: ClockSource): StandardTime | undefined {
  const { stamps, settings } = source;
  if (stamps.offsets !== undefined) return fromInstants(source, stamps.offsets);
  if (settings.clock === 'local') return fromLocalClock(source, 'settings');
  if (mayKeepLocalClock(source)) {
    const local = fromLocalClock(source, 'recognised');
    if (local !== undefined) return local;
  }
  const shift = source.atEnd ? source.order.step : 0;
  const stated = settings.offset === undefined ? undefined : offsetMinutes(settings.offset);
  return {
    minutes: shift === 0 ? stamps.minutes : stamps.minutes.map((minute) => minute - shift),
    offsetMinutes: stated ?? source.headerOffset ?? source.defaultOffsetMinutes,
    offsetFrom: stated !== undefined ? 'settings' : source.headerOffset !== undefined ? 'header' : 'site',
    clock: 'standard',
    clockFrom: settings.clock === undefined ? 'assumed' : 'settings',
  };
}

/** A clock that changes leaves rows out of step; where there are none, the zone need not be asked. */
function mayKeepLocalClock({ settings, headerOffset, stamps, order }: ClockSource): boolean {
  if (settings.clock !== undefined || headerOffset !== undefined || !stamps.hasYears) return false;
  return irregularRows(stamps.minutes, strideOf(order)).length > 0;
}

/** Minutes of an offset such as `+01:00`. */
export function offsetMinutes(offset: string | number): number {
  if (typeof offset === 'number') return offset;
  const match = /^([+-])(\d{2}):(\d{2})$/.exec(offset);
  if (!match) return 0;
  return (match[1] === '-' ? -1 : 1) * (Number(match[2]) * 60 + Number(match[3]));
}

/** Stamps that carry offsets are instants; the smallest offset is that of standard time, summer time adds to it. */
function fromInstants({ stamps, order, atEnd, settings }: ClockSource, offsets: Float64Array): StandardTime {
  const { least, most } = rangeOf(offsets);
  const standard = settings.offset === undefined ? least : offsetMinutes(settings.offset);
  const shift = standard - (atEnd ? order.step : 0);
  return {
    minutes: stamps.minutes.map((minute, i) => minute - (offsets[i] as number) + shift),
    offsetMinutes: standard,
    offsetFrom: settings.offset === undefined ? 'stamps' : 'settings',
    clock: most > least ? 'local' : 'standard',
    clockFrom: 'recognised',
  };
}

/**
 * The local clock, stated or to be recognised. Stamps at the end of a step may show the clock at that end, or the clock
 * at the beginning plus the step (hours numbered 1 to 24): whichever leaves fewer rows out of step.
 */
function fromLocalClock(source: ClockSource, from: 'settings' | 'recognised'): StandardTime | undefined {
  const { stamps, order, atEnd, settings, zone } = source;
  const spans = spansOf(source);
  if (spans === undefined || !stamps.hasYears) {
    if (from === 'settings') reportNoLocalClock(source);
    return undefined;
  }
  if (from === 'recognised' && spans.length < 2) return undefined;
  const standardOffset = Math.min(...spans.map((span) => span.offsetMinutes));
  const clock: LocalClock = { spans, standardOffset, backwards: order.backwards };
  const ways = (atEnd ? [0, order.step] : [0]).map((first) => {
    const readings = stamps.minutes.map((minute) => minute - first);
    const minutes = localToStandard(readings, clock);
    return {
      readings,
      minutes,
      later: (atEnd ? order.step : 0) - first,
      irregular: irregularRows(minutes, strideOf(order)).length,
    };
  });
  const best = ways.reduce((a, b) => (b.irregular < a.irregular ? b : a));
  if (from === 'recognised' && !keepsLocalClock(best.readings, best.minutes, strideOf(order), spans)) return undefined;
  reportMissingReadings(source, best.minutes, zone ?? '');
  const stated = settings.offset === undefined ? undefined : offsetMinutes(settings.offset);
  const shift = (stated ?? standardOffset) - standardOffset - best.later;
  return {
    minutes: best.minutes.map((minute) => minute + shift),
    offsetMinutes: stated ?? standardOffset,
    offsetFrom: stated === undefined ? 'zone' : 'settings',
    clock: 'local',
    clockFrom: from,
  };
}

function spansOf({ stamps, zone }: ClockSource): readonly OffsetSpan[] | undefined {
  if (zone === undefined) return undefined;
  const { least, most } = rangeOf(stamps.minutes);
  return least <= most ? zoneOffsets(zone, least - TWO_DAYS, most + TWO_DAYS) : undefined;
}

function reportNoLocalClock({ stamps, zone, findings }: ClockSource): void {
  if (zone === undefined) findings.add({ code: 'weather.clock-needs-zone', severity: 'error', path: 'clock' });
  else if (!stamps.hasYears) findings.add({ code: 'weather.clock-needs-year', severity: 'error', path: 'clock' });
  else findings.add({ code: 'weather.unknown-zone', severity: 'error', found: zone });
}

function reportMissingReadings({ stamps, lines, findings }: ClockSource, minutes: Float64Array, zone: string): void {
  for (let i = 0; i < minutes.length; i++) {
    const reading = stamps.minutes[i] as number;
    if (Number.isNaN(reading) || !Number.isNaN(minutes[i])) continue;
    findings.add({
      code: 'weather.no-such-clock-time',
      severity: 'error',
      line: lines[i] as number,
      found: stampText(reading, true),
      allowed: zone,
    });
  }
}
