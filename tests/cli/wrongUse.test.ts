import { describe, expect, it } from 'vitest';
import type { Io } from '../../cli/io.ts';
import { runProgram } from '../../cli/program.ts';
import { folderWithDemo, run } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const weather = 'data/demo/weather.csv';

/** The program within this process: nothing here gets as far as a file. */
async function use(...words: string[]) {
  const said = { stdout: '', stderr: '' };
  const sink = (name: 'stdout' | 'stderr') => ({
    write: async (text: string) => {
      said[name] += text;
    },
  });
  const io: Io = { stdout: sink('stdout'), stderr: sink('stderr'), colour: false, version: '9.9.9' };
  return { code: await runProgram(words, io), ...said };
}

describe('wrong use', () => {
  it.each([
    [['simulat', house], "unknown command 'simulat' (Did you mean simulate?)"],
    [['frobnicate'], "unknown command 'frobnicate'"],
    [['simulate'], "missing required argument 'SCENARIO'"],
    [['check'], "missing required argument 'FILE'"],
    [['simulate', house, weather], "too many arguments for 'simulate'"],
    [['simulate', house, '--jsn', 'x'], "unknown option '--jsn' (Did you mean --json?)"],
    [['degree-days', weather, '--method', 'median'], 'Allowed choices are hours, mean, minmax, fourcase, threshold'],
    [['degree-days', weather, '--base'], "'--base <TEMPERATURE>' argument missing"],
    [['degree-days', weather, '--base', '15,5'], "--base is '15,5'; it is a temperature from −50 to 50 °C"],
    [['degree-days', weather, '--base', '60'], "--base is '60'; it is a temperature from −50 to 50 °C"],
    [['simulate', house, '--json', '--hourly', 'x'], "'--json' needs the name of a file; behind it stands '--hourly'"],
    [['simulate', house, '--json='], "'--json' needs the name of a file"],
    [['simulate', house, '--json', ''], 'the name of a file is empty'],
    [['--verson'], "unknown option '--verson' (Did you mean --version?)"],
  ])('is told in two lines with exit code 2: %j', async (words, message) => {
    const { code, stdout, stderr } = await use(...words);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toContain(message);
    expect(stderr).toMatch(/^winterledger {2}\S.*\n {4}→ winterledger .*--help shows what there is\n$/);
  });

  it('shows control characters of the command line as escapes', async () => {
    const { stderr } = await use('simulate\u001b[31m');
    expect(stderr).toContain('simulate\\u001b[31m');
  });

  it('points to the help of the command that was meant', async () => {
    expect((await use('check', '--jsn')).stderr).toContain('→ winterledger check --help');
    expect((await use('chek')).stderr).toContain('→ winterledger --help');
  });

  it('ends the built program with exit code 2', async () => {
    const { code, stdout } = await run(folder, 'simulat', house);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
  });
});
