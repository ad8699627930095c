import { readdirSync } from 'node:fs';
import path from 'node:path';

export type RouteHandler = (
  request: Request,
  context: { params: Promise<Record<string, string>> },
) => Promise<Response>;

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];
const API = path.resolve(import.meta.dirname, '../../app/api');

const isHandler = (value: unknown): value is RouteHandler => typeof value === 'function';

/** Every handler that app/api exports, by "METHOD /path", read from disk. */
export async function handlersOnDisk(): Promise<Map<string, RouteHandler>> {
  const found = new Map<string, RouteHandler>();
  const files = readdirSync(API, { recursive: true, encoding: 'utf8' }).filter((file) => /(^|\/)route\.ts$/.test(file));
  for (const file of files) {
    const module: Record<string, unknown> = await import(path.join(API, file));
    const route = `/api/${path.dirname(file)}`;
    for (const method of METHODS) {
      const handler = module[method];
      if (isHandler(handler)) found.set(`${method} ${route}`, handler);
    }
  }
  return found;
}

/** Fills a route's [names] in. */
export const fillPath = (route: string, params: Readonly<Record<string, string>>): string =>
  route.replaceAll(/\[(?:\.\.\.)?([a-z]+)\]/g, (_, name: string) => encodeURIComponent(params[name] ?? `no-${name}`));
