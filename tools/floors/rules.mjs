import { floors, nodeFloors, packages } from './allowList.mjs';

/** @param {string} text */
const escaped = (text) => text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');

/** A floor is a folder, `recorder/ports.ts` is one file of it. @param {string} target */
const pathOf = (target) => (target.includes('.') ? `src/${escaped(target)}$` : `src/${escaped(target)}/`);

/** Where a package is seen: resolved into node_modules, or by its bare name when it is virtual. @param {string} name */
const packagePath = (name) =>
  name.endsWith('/') ? `(^|/)node_modules/${escaped(name)}` : `((^|/)node_modules/|^)${escaped(name)}(/|$)`;

/**
 * dependency-cruiser's rules, made from the allow-list: one rule a floor and kind of reach.
 *
 * @returns {import('dependency-cruiser').IForbiddenRuleType[]}
 */
export function rulesFromAllowList() {
  /** @type {import('dependency-cruiser').IForbiddenRuleType[]} */
  const rules = [];
  for (const [floor, allowance] of Object.entries(floors)) {
    const from = `^src/${floor}/`;
    const { types = [], files = [], lazily = [], lazyFiles } = allowance;
    const reachable = [floor, ...allowance.floors, ...types, ...files, ...lazily].map(pathOf);
    rules.push({
      name: `${floor}-floors`,
      severity: 'error',
      comment: `src/${floor}/ may import only: ${[...allowance.floors, ...files].join(', ') || 'nothing of ours'}`,
      from: { path: from },
      to: { path: '^src/', pathNot: `^(${reachable.join('|')})` },
    });
    if (types.length > 0) {
      rules.push({
        name: `${floor}-types`,
        severity: 'error',
        comment: `src/${floor}/ may import only types (import type) from: ${types.join(', ')}`,
        from: { path: from },
        to: { path: `^(${types.map(pathOf).join('|')})`, dependencyTypesNot: ['type-only'] },
      });
    }
    if (lazily.length > 0) {
      rules.push({
        name: `${floor}-lazily`,
        severity: 'error',
        comment: `src/${floor}/ may import ${lazily.join(', ')} only by import(), or in its methods files`,
        from: lazyFiles === undefined ? { path: from } : { path: from, pathNot: lazyFiles },
        to: { path: `^(${lazily.map(pathOf).join('|')})`, dynamic: false },
      });
    }
    const own = Object.keys(packages).filter((name) => packages[name]?.includes(floor));
    rules.push({
      name: `${floor}-packages`,
      severity: 'error',
      comment: `src/${floor}/ may use only these packages: ${own.join(', ') || 'none'}`,
      from: { path: from },
      to: {
        // Whatever is not a file of ours and not Node's own is a package, also when it cannot be found.
        pathNot: ['^(src|test|tools)/', ...own.map(packagePath)],
        dependencyTypesNot: ['core'],
      },
    });
    if (!nodeFloors.includes(floor)) {
      rules.push({
        name: `${floor}-node`,
        severity: 'error',
        comment: `src/${floor}/ runs in a browser: no module of Node`,
        from: { path: from },
        to: { dependencyTypes: ['core'] },
      });
    }
  }
  rules.push(
    {
      name: 'src-outside',
      severity: 'error',
      comment: 'src/ never imports from test/, tools/ or anything else outside of src/',
      from: { path: '^src/' },
      to: { path: '^(?!src/)', dependencyTypes: ['local'] },
    },
    {
      name: 'no-cycle',
      severity: 'error',
      comment: 'two files that import each other are one idea or want a third',
      from: { path: '^src/' },
      to: { circular: true },
    },
    {
      name: 'no-unknown-floor',
      severity: 'error',
      comment: `a folder under src/ is one of the floors of tools/floors/allowList.mjs`,
      from: { path: '^src/', pathNot: [`^src/(${Object.keys(floors).join('|')})/`, '\\.d\\.ts$'] },
      to: {},
    },
  );
  return rules;
}
