import { writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** What the package with a Chromium gives, as far as it is used. */
export interface ChromiumPackage {
  readonly default: { readonly executablePath: () => Promise<string> };
}

/** A program and what its environment needs beside ours. */
export interface PackagedBrowser {
  readonly program: string;
  readonly env: Readonly<Record<string, string>>;
}

/**
 * Unpacks the Chromium of the package.
 *
 * @param folder for it alone, and for one version: the package takes whatever lies there for what it would unpack
 * @param load loads the package
 * @returns nothing where the package is not installed
 */
export async function unpackBrowser(
  folder: string,
  load: () => Promise<ChromiumPackage>,
): Promise<PackagedBrowser | undefined> {
  const names = ['TMPDIR', 'AWS_EXECUTION_ENV', 'FONTCONFIG_PATH', 'HOME', 'LD_LIBRARY_PATH'] as const;
  const before = names.map((name) => [name, process.env[name]] as const);
  try {
    // It unpacks into the folder for passing files; with this name of an environment also the libraries that a bare
    // machine lacks.
    Object.assign(process.env, { TMPDIR: folder, AWS_EXECUTION_ENV: 'AWS_Lambda_nodejs20.x' });
    const program = await (await load()).default.executablePath();
    const fonts = join(folder, 'winterledger-fonts.conf');
    writeFileSync(fonts, fontSettings(folder));
    return { program, env: { LD_LIBRARY_PATH: join(folder, 'al2023', 'lib'), FONTCONFIG_FILE: fonts } };
  } catch {
    return undefined;
  } finally {
    for (const [name, value] of before) {
      if (value === undefined) delete process.env[name];
      else process.env[name] = value;
    }
  }
}

/** Fonts of the machine, and those of the package where it has none: its own settings look for them elsewhere. */
function fontSettings(folder: string): string {
  return `<?xml version="1.0"?>
<!DOCTYPE fontconfig SYSTEM "fonts.dtd">
<fontconfig>
  <include ignore_missing="yes">/etc/fonts/fonts.conf</include>
  <dir>${join(folder, 'fonts', 'fonts')}</dir>
  <cachedir>${join(folder, 'fonts-cache')}</cachedir>
</fontconfig>
`;
}
