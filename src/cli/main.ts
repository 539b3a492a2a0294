import { run } from './run';

// A reader that stops early (`| head`) is no fault.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
});

void run(process.argv.slice(2), {
  cwd: process.cwd(),
  write: text => void process.stdout.write(text),
  complain: text => void process.stderr.write(text),
  now: () => new Date(),
}).then(code => {
  process.exitCode = code;
});
