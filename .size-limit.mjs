import { existsSync, readFileSync } from 'node:fs';

const DIST = 'packages/web/dist';
const manifestFile = `${DIST}/.vite/manifest.json`;
if (!existsSync(manifestFile)) throw new Error('Build the page first: npm run build:web.');
const manifest = JSON.parse(readFileSync(manifestFile, 'utf8'));

/** The files that a page cannot be shown without: its own chunk, and whatever that and the entry import. */
function filesOf(sources, kind) {
  const names = new Set();
  const add = (name) => {
    if (names.has(name)) return;
    names.add(name);
    (manifest[name].imports ?? []).forEach(add);
  };
  ['index.html', ...sources].forEach(add);
  const files = [...names].flatMap((name) =>
    kind === 'css' ? (manifest[name].css ?? []) : manifest[name].file,
  );
  return [...new Set(files)].map((file) => `${DIST}/${file}`);
}

const routeFile = (route) => `src/routes/${route}.tsx`;
const page = (name, route, limit) => ({ name, path: filesOf([routeFile(route)], 'js'), limit });
/** Whoever is signed in needs the shapes of the wire before anything is shown. */
const ownPage = (name, route, limit) => ({
  name,
  path: filesOf([routeFile(route), 'src/lib/answers.ts'], 'js'),
  limit,
});

// Brotli, as it is sent.
export default [
  page('script of the first page', 'landing', '115 kB'),
  page('script of the sign-in', 'sign-in', '150 kB'),
  page('script of the stop page', 'stop', '120 kB'),
  ownPage('script of the bench', 'bench', '200 kB'),
  ownPage('script of a question sheet', 'question', '200 kB'),
  { name: 'styles of the first page', path: filesOf([routeFile('landing')], 'css'), limit: '12 kB' },
];
