import type { Airframe } from '@/lib/airframe/schema/airframe';

/** A file name that every system takes, made from the aircraft's name. */
export function fileNameOf(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .toLowerCase();
  return `${plain || 'airframe'}.foldspar.json`;
}

/** Hands the airframe to the browser as a file to keep. */
export function downloadAirframe(airframe: Airframe): void {
  const url = URL.createObjectURL(new Blob([`${JSON.stringify(airframe, null, 2)}\n`], { type: 'application/json' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = fileNameOf(airframe.name);
  link.click();
  URL.revokeObjectURL(url);
}
