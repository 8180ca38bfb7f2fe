import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { floors, nodeFloors, packages } from './allowList.mjs';

/**
 * Small source trees in which every rule is broken once, and in which every allowance is used once.
 * A rule that lets its planted violation pass, or forbids what is allowed, is a broken rule.
 *
 * @typedef {{ file: string, text: string, rule: string | null, what: string }} Plant
 *   `rule` is the one rule that must report the file; null: none may.
 */

/** A package name as an import writes it. @param {string} name */
const specifier = (name) =>
  name === '@stdlib/'
    ? '@stdlib/stats-base-dists-t-cdf'
    : name === '@fontsource-variable/'
      ? '@fontsource-variable/atkinson-hyperlegible-next'
      : name;

/** @returns {Plant[]} */
export function plants() {
  /** @type {Plant[]} */
  const list = [];
  let count = 0;
  /** @param {string} floor @param {string} text @param {string | null} rule @param {string} what @param {string} [name] */
  const plant = (floor, text, rule, what, name) => {
    count += 1;
    list.push({ file: `src/${floor}/${name ?? `plant${count}`}.ts`, text: `${text}\n`, rule, what });
  };

  for (const [floor, allowance] of Object.entries(floors)) {
    const { types = [], files = [], lazily = [] } = allowance;
    for (const other of Object.keys(floors)) {
      if (other === floor) continue;
      const value = `import { leaf } from '../${other}/leaf.ts';\nexport const x = leaf;`;
      const type = `import type { Leaf } from '../${other}/leaf.ts';\nexport type X = Leaf;`;
      const both = `import { leaf } from '../${other}/leaf.ts';\nimport type { Leaf } from '../${other}/leaf.ts';\nexport const x: Leaf = leaf;`;
      const later = `export const x = () => import('../${other}/leaf.ts');`;
      const what = `${floor} imports ${other}`;
      if (allowance.floors.includes(other)) plant(floor, value, null, what);
      else if (types.includes(other)) {
        plant(floor, type, null, `${what} (type)`);
        plant(floor, value, `${floor}-types`, what);
        plant(floor, both, `${floor}-types`, `${what} (type and value)`);
      } else if (lazily.includes(other)) {
        plant(floor, later, null, `${what} (lazily)`);
        plant(floor, value, null, `${what} (methods file)`, `methodsPlant${count}`);
        plant(floor, value, `${floor}-lazily`, what);
      } else {
        plant(floor, value, `${floor}-floors`, what);
        plant(floor, type, `${floor}-floors`, `${what} (type)`);
        plant(floor, later, `${floor}-floors`, `${what} (lazily)`);
      }
    }
    for (const file of types.filter((target) => target.includes('.'))) {
      const type = `import type { Leaf } from '../${file}';\nexport type X = Leaf;`;
      const value = `import { leaf } from '../${file}';\nexport const x = leaf;`;
      plant(floor, type, null, `${floor} imports ${file} (type)`);
      plant(floor, value, `${floor}-types`, `${floor} imports ${file}`);
    }
    for (const file of files) {
      const value = `import { leaf } from '../${file}';\nexport const x = leaf;`;
      plant(floor, value, null, `${floor} imports ${file}`);
    }
    for (const [name, users] of Object.entries(packages)) {
      const allowed = users.includes(floor);
      const text = `import * as x from '${specifier(name)}';\nexport { x };`;
      plant(floor, text, allowed ? null : `${floor}-packages`, `${floor} uses ${name}`);
    }
    plant(floor, `import 'left-over';`, `${floor}-packages`, `${floor} uses a package that is not listed`);
    const node = nodeFloors.includes(floor) ? null : `${floor}-node`;
    plant(floor, `import * as fs from 'node:fs';\nexport { fs };`, node, `${floor} uses node:fs`);
    plant(floor, `import '../../test/leaf.ts';`, 'src-outside', `${floor} imports test/`);
    plant(floor, `import '../../tools/leaf.ts';`, 'src-outside', `${floor} imports tools/`);
  }
  plant(
    'kernel',
    `import { b } from './cycleB.ts';\nexport const a = () => b;`,
    'no-cycle',
    'a cycle',
    'cycleA',
  );
  plant('attic', `import './leaf.ts';`, 'no-unknown-floor', 'a floor that is not listed', 'plant');
  // The app may import every floor there is, so only a floor that is not one is out of its reach.
  plant('app', `import '../attic/leaf.ts';`, 'app-floors', 'app imports a floor that is not listed');
  return list;
}

/**
 * Writes the plants, and the leaves that they import, below a folder that is emptied before.
 *
 * @param {string} root
 * @param {Plant[]} list
 */
export function writePlants(root, list) {
  rmSync(root, { recursive: true, force: true });
  const leaf = `export type Leaf = string;\nexport const leaf: Leaf = 'leaf';\n`;
  const single = Object.values(floors).flatMap(({ types = [], files = [] }) =>
    [...types, ...files].filter((target) => target.includes('.')),
  );
  const leaves = [
    ...Object.keys(floors).map((floor) => `src/${floor}/leaf.ts`),
    ...single.map((file) => `src/${file}`),
    'src/attic/leaf.ts',
    'test/leaf.ts',
    'tools/leaf.ts',
  ];
  const texts = new Map([
    ...leaves.map((file) => /** @type {const} */ ([file, leaf])),
    ...list.map(({ file, text }) => /** @type {const} */ ([file, text])),
    // The other half of the planted cycle: a cycle is reported once, for its first file.
    ['src/kernel/cycleB.ts', `import { a } from './cycleA.ts';\nexport const b = () => a;\n`],
  ]);
  for (const [file, text] of texts) {
    mkdirSync(dirname(join(root, file)), { recursive: true });
    writeFileSync(join(root, file), text);
  }
  return texts.size;
}
