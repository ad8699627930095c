import { plan } from '@/lib/text/en/plan';
import { complain } from './report';

// Each command is loaded when it is asked for: `figures` must not wait for the PDF writer.

async function run([command, ...args]: readonly string[]): Promise<number> {
  switch (command) {
    case 'figures':
      return (await import('./figures')).figures(args);
    case 'sheets':
      return (await import('./sheets')).sheets(args);
    case 'job':
      return (await import('./job')).job();
    default:
      return complain(plan.cli.usage);
  }
}

process.exitCode = await run(process.argv.slice(2));
