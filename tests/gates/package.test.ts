import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root, textOf } from './houseFiles.ts';

interface Package {
  readonly files: readonly string[];
  readonly bin: Readonly<Record<string, string>>;
  readonly scripts: Readonly<Record<string, string>>;
  readonly version: string;
  readonly dependencies: Readonly<Record<string, string>>;
  readonly devDependencies: Readonly<Record<string, string>>;
}

interface Lock {
  readonly version: string;
  readonly packages: Readonly<
    Record<string, { readonly version?: string; readonly integrity?: string; readonly link?: true }>
  >;
}

const pack = JSON.parse(textOf('package.json')) as Package;
const lockText = textOf('package-lock.json');
const lock = JSON.parse(lockText) as Lock;

describe('package.json', () => {
  it.each([...pack.files, ...Object.values(pack.bin)])('ships %s, which is there once built', (path) => {
    expect(existsSync(join(root, path))).toBe(true);
  });

  it('calls only scripts that are there', () => {
    const called = Object.values(pack.scripts).flatMap((line) => line.match(/scripts\/[\w.-]+/g) ?? []);
    expect(called.length).toBeGreaterThanOrEqual(3);
    expect(called.filter((path) => !existsSync(join(root, path)))).toEqual([]);
  });

  it('names every library by one version', () => {
    const versions = Object.entries({ ...pack.dependencies, ...pack.devDependencies });
    expect(versions.length).toBeGreaterThan(15);
    expect(versions.filter(([, version]) => !/^(?:npm:[\w@/-]+@)?\d+\.\d+\.\d+$/.test(version))).toEqual([]);
  });
});

describe('the lock file', () => {
  const installed = Object.entries(lock.packages).filter(([path]) => path !== '');

  it('names no address to fetch from, so that it works with any mirror', () => {
    expect(lockText).not.toContain('"resolved"');
    expect(installed.map(([path]) => path).filter((path) => /https?:/.test(path))).toEqual([]);
  });

  it('knows the content of every package by its checksum', () => {
    expect(installed.length).toBeGreaterThan(100);
    expect(
      installed.filter(([, { integrity, link }]) => integrity === undefined && link !== true).map(([path]) => path),
    ).toEqual([]);
  });

  it('is that of package.json', () => {
    expect(lock.version).toBe(pack.version);
    const wanted = Object.entries({ ...pack.dependencies, ...pack.devDependencies });
    const differs = wanted.filter(
      ([name, version]) => lock.packages[`node_modules/${name}`]?.version !== version.replace(/^npm:.*@/, ''),
    );
    expect(differs).toEqual([]);
  });
});
