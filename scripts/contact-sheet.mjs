// Makes a contact sheet of every page as every demo member sees it, so that the look can be judged at a glance.
//
//   node scripts/contact-sheet.mjs http://127.0.0.1:3000 SIGNINS-FILE [--out contact-sheet] [--widths 390,1440] [--schemes light,dark]
//
// SIGNINS-FILE is the one in the data folder: name, address, password and roles, parted by tabs. The server must be running.
// Pages are found by following links; one of each kind is kept. Exit 1 when a page overflows sideways, breaks, or writes an error to the console.
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { parseArgs } from 'node:util';
import { chromium } from '@playwright/test';

const START = [
  '/',
  '/try',
  '/sign-in',
  '/sign-up',
  '/forgot',
  '/reset',
  '/verify-sent',
  '/outbox',
  '/invite/none',
  '/nothing-here',
];
const START_SIGNED_IN = ['/w', '/account', ...START.filter((start) => !start.startsWith('/sign'))];
const MOST_PAGES = 60;

const { values: options, positionals } = parseArgs({
  allowPositionals: true,
  options: {
    out: { type: 'string', default: 'contact-sheet' },
    widths: { type: 'string', default: '390,1440' },
    schemes: { type: 'string', default: 'light,dark' },
  },
});
const [origin, signInsFile] = positionals;
if (origin === undefined) {
  console.error(
    'usage: node scripts/contact-sheet.mjs ORIGIN [SIGNINS-FILE] [--out DIR] [--widths 390,1440] [--schemes light,dark]',
  );
  process.exit(2);
}
const widths = options.widths.split(',').map(Number);
const schemes = options.schemes.split(',');

/** People of the file, by the local part of their address; nobody first. */
function people() {
  const lines = signInsFile === undefined ? [] : readFileSync(signInsFile, 'utf8').split('\n');
  // Name, address, password and roles, as the start script writes them.
  const found = lines.flatMap((line) => {
    const [, email, password] = line.split('\t');
    return password === undefined ? [] : [{ name: email.split('@')[0], email, password }];
  });
  return [{ name: 'nobody' }, ...found];
}

/** "/w/0b8f…/d/77…/r/2" and its like are one kind of page. */
const kindOf = (address) => address.replace(/\/[0-9a-f-]{36}|\/\d+/g, '/x');
const fileName = (address) => (kindOf(address).replaceAll('/', '_').replace(/^_/, '') || 'front').slice(0, 60);

async function signIn(page, { email, password }) {
  await page.goto(`${origin}/sign-in`);
  await page.locator('input[name=email]').fill(email);
  await page.locator('input[name=password]').fill(password);
  await page.locator('button[type=submit]').click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

/** Until the board is drawn and its figures stand, where the page holds one; a picture of an empty film says nothing. */
async function settled(page) {
  await page.waitForLoadState('networkidle');
  await page.locator('.film [role=status]').waitFor({ state: 'detached' });
  const mass = page.getByTestId('figure-allUpMassG');
  if ((await mass.count()) > 0) await mass.filter({ hasText: /\d/ }).waitFor();
}

/** Addresses on this site that the page links to, without files of the API. */
const linksOf = (page) =>
  page
    .locator('a[href^="/"]')
    .evaluateAll((links) =>
      links.map((link) => new URL(link.href).pathname).filter((address) => !address.startsWith('/api/')),
    );

/** One address of each kind, found from the starting points on. */
async function pagesFor(page, start) {
  const queue = [...start];
  const kinds = new Map();
  while (queue.length > 0 && kinds.size < MOST_PAGES) {
    const address = queue.shift();
    if (address === undefined || kinds.has(kindOf(address))) continue;
    kinds.set(kindOf(address), address);
    await page.goto(origin + address, { waitUntil: 'load' });
    queue.push(...(await linksOf(page)));
  }
  return [...kinds.values()];
}

/** Takes one picture and says what is wrong with the page. */
async function picture(page, address, file) {
  const faults = [];
  const onConsole = (message) => message.type() === 'error' && faults.push(`console: ${message.text()}`);
  const onError = (error) => faults.push(`script: ${error.message}`);
  page.on('console', onConsole);
  page.on('pageerror', onError);
  const response = await page.goto(origin + address, { waitUntil: 'load' });
  await page.evaluate(() => document.fonts.ready);
  await settled(page);
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  if (over > 0) faults.push(`overflows sideways by ${over} px`);
  const status = response?.status() ?? 0;
  if (status >= 500) faults.push(`answers ${status}`);
  await page.screenshot({ path: file, fullPage: true });
  page.off('console', onConsole);
  page.off('pageerror', onError);
  // The browser itself reports an expected 404 as a console error.
  return faults.filter((fault) => !(status === 404 && fault.includes('404')));
}

const plain = (text) => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);

/** Pictures side by side, a row a page, a column a width and scheme. */
function sheetHtml(name, rows) {
  const cell = ({ file, label, faults }) =>
    `<figure><a href="${file}"><img src="${file}" alt=""></a><figcaption>${plain(label)}${faults.map((fault) => `<b>${plain(fault)}</b>`).join('')}</figcaption></figure>`;
  const body = rows
    .map(({ address, shots }) => `<h2>${plain(address)}</h2><div>${shots.map(cell).join('')}</div>`)
    .join('\n');
  return `<!doctype html><meta charset="utf-8"><title>${plain(name)}</title><style>body{font:14px sans-serif;margin:16px}div{display:flex;gap:12px;align-items:flex-start}figure{margin:0;width:25%}img{width:100%;max-height:700px;object-fit:cover;object-position:top;border:1px solid #999}b{display:block;color:#b00}</style><h1>${plain(name)}</h1>${body}`;
}

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
});
let wrong = 0;
for (const person of people()) {
  const folder = path.join(options.out, person.name);
  mkdirSync(folder, { recursive: true });
  const state = await browser.newContext();
  const first = await state.newPage();
  if (person.email !== undefined) await signIn(first, person);
  const addresses = await pagesFor(first, person.email === undefined ? START : START_SIGNED_IN);
  const rows = addresses.map((address) => ({ address: kindOf(address), shots: [] }));
  const storageState = await state.storageState();
  for (const colorScheme of schemes) {
    for (const width of widths) {
      const context = await browser.newContext({
        storageState,
        colorScheme,
        viewport: { width, height: 900 },
        reducedMotion: 'reduce',
      });
      const page = await context.newPage();
      for (const [index, address] of addresses.entries()) {
        const file = `${fileName(address)}-${width}-${colorScheme}.png`;
        const faults = await picture(page, address, path.join(folder, file));
        wrong += faults.length;
        for (const fault of faults) console.log(`${person.name} ${kindOf(address)} ${width} ${colorScheme}: ${fault}`);
        rows[index].shots.push({ file, label: `${width} ${colorScheme}`, faults });
      }
      await context.close();
    }
  }
  await state.close();
  const html = path.join(folder, 'index.html');
  writeFileSync(html, sheetHtml(person.name, rows));
  const sheet = await browser.newPage({ viewport: { width: 1600, height: 900 } });
  await sheet.goto(pathToFileURL(path.resolve(html)).href);
  await sheet.screenshot({ path: path.join(options.out, `${person.name}.png`), fullPage: true });
  await sheet.close();
  console.log(`${person.name}: ${addresses.length} pages, ${html}`);
}
await browser.close();
process.exit(wrong > 0 ? 1 : 0);
