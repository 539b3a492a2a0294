// Runs one program to its end.
import { spawn } from 'node:child_process';
import path from 'node:path';

export const root = path.resolve(import.meta.dirname, '..');

/** A program of node_modules/.bin. */
export const tool = name => path.join(root, 'node_modules', '.bin', name);

/** Gives exit code and everything printed; `show` passes the output on as it comes. A program that cannot start gives 127. */
export function command(program, args, { cwd = root, env = {}, show = false } = {}) {
  return new Promise(resolve => {
    const child = spawn(program, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const take = chunk => {
      output += chunk;
      if (show) process.stdout.write(chunk);
    };
    child.stdout.setEncoding('utf8').on('data', take);
    child.stderr.setEncoding('utf8').on('data', take);
    child.once('error', error => resolve({ code: 127, output: `${program}: ${error.message}` }));
    child.once('close', code => resolve({ code: code ?? 1, output }));
  });
}
