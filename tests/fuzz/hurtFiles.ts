import { createHash } from 'node:crypto';
import type { FileSource, InputBytes } from '../../src/scenario/fileSource.ts';
import { Kept } from '../../src/scenario/kept.ts';
import { weathers } from '../../src/scenario/loadWeather.ts';
import { type SoundName, soundFiles } from './soundFiles.ts';

/** Files of which one is hurt. */
export interface HurtFiles extends FileSource {
  /** The hurt file as far as it is text: what stands in it may stand in a message. */
  readonly written: string;
  /** What the sound files among them come to, made once. */
  readonly kept: Kept;
}

const keptOfSoundFiles = new Kept();

const sound = new Map<string, InputBytes>(
  Object.entries(soundFiles).map(([name, text]) => [name, inputOf(name, new TextEncoder().encode(text))]),
);

function inputOf(name: string, bytes: Uint8Array): InputBytes {
  return { name, bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
}

let hurtFiles = 0;

/** The sound files, one of them with other bytes and a name of its own; nothing that is read from it is kept. */
export function filesWithHurt(hurt: SoundName, bytes: Uint8Array): HurtFiles {
  hurtFiles++;
  const broken = inputOf(`${hurtFiles}/${hurt}`, bytes);
  return {
    written: new TextDecoder('utf-8').decode(bytes),
    kept: hurt.endsWith('.csv') ? withWeatherAlone() : keptOfSoundFiles,
    read(name) {
      if (name === hurt) return broken;
      return sound.get(name) ?? { code: 'file.missing', severity: 'error', file: name };
    },
  };
}

/** A table is read where another file names it, and what came of that is kept with the other file. */
function withWeatherAlone(): Kept {
  const kept = new Kept();
  weathers.put(kept, weathers.entriesOf(keptOfSoundFiles));
  return kept;
}
