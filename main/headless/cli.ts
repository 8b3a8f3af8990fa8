import { runHeadless } from './runHeadless';

// A reader that has seen enough (`| head`) is no fault.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit(0);
  throw error;
});

process.exitCode = await runHeadless(process.argv.slice(2), {
  input: process.stdin,
  out: (text) => void process.stdout.write(text),
  err: (text) => void process.stderr.write(text),
});
