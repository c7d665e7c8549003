import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import type { FileSource } from '../../src/scenario/fileSource.ts';
import { InputFiles, type InputRecord, type InputRole } from '../../src/scenario/inputFiles.ts';
import type { Kept } from '../../src/scenario/kept.ts';
import type { YamlFile } from '../../src/scenario/yaml/yamlFile.ts';

/** Files that a file names, by the file that names them, of each run. */
const named = new WeakMap<Kept, Map<string, Map<string, InputRecord>>>();

/**
 * Input files whose record is whole although what was kept is not read again: the price series that a tariff names, and
 * the tables that a unit names, are remembered from the first time.
 */
export class KeptFiles extends InputFiles {
  readonly #named: Map<string, Map<string, InputRecord>>;

  constructor(source: FileSource, kept: Kept) {
    super(source, kept);
    this.#named = named.get(kept) ?? new Map();
    named.set(kept, this.#named);
  }

  override get records(): InputRecord[] {
    const whole: InputRecord[] = [];
    const add = (record: InputRecord): void => {
      if (whole.some(({ file, role }) => file === record.file && role === record.role)) return;
      whole.push(record);
      if (record.role === 'unit' || record.role === 'tariff') this.#named.get(record.file)?.forEach(add);
    };
    super.records.forEach(add);
    return whole;
  }

  override readNamed(name: string, role: InputRole, by: { yaml: YamlFile; path: EntryPath }) {
    const result = super.readNamed(name, role, by);
    const { input } = result;
    if (input !== undefined) {
      const owner = by.yaml.owner(by.path);
      const known = this.#named.get(owner) ?? new Map<string, InputRecord>();
      known.set(`${role} ${input.name}`, { file: input.name, role, sha256: input.sha256 });
      this.#named.set(owner, known);
    }
    return result;
  }
}
