import { expect, test } from 'vitest';
import { suggestPseudonym } from '../../../src/screens/study/suggestPseudonym.ts';

const animals = ['Heron', 'Vole'];

test('the next free number of the class’s word, gaps first', () => {
  expect(suggestPseudonym('Class Otter', ['Otter-01', 'Otter-02'], animals)).toBe('Otter-03');
  expect(suggestPseudonym('Class Otter', ['Otter-01', 'Otter-03'], animals)).toBe('Otter-02');
  expect(suggestPseudonym('Class Otter', ['otter-01'], animals)).toBe('otter-02');
});

test('without children the last word of the class’s name', () => {
  expect(suggestPseudonym('Class Otter', [], animals)).toBe('Otter-01');
  expect(suggestPseudonym('badger', [], animals)).toBe('Badger-01');
});

test('a name that tells nothing but the class gives an animal, the same one each time', () => {
  expect(suggestPseudonym('3b', [], animals)).toBe(suggestPseudonym('3b', [], animals));
  expect(animals.map((animal) => `${animal}-01`)).toContain(suggestPseudonym('3b', [], animals));
});

test('the word that the children have wins over the name of the class', () => {
  expect(suggestPseudonym('Class Otter', ['Wren-01', 'Wren-02', 'Otter-01'], animals)).toBe('Wren-03');
});
