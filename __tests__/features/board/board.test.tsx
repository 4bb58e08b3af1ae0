import { screen } from '@testing-library/react';

import { BoardScreen } from '@/features/board/board-screen';
import { cautionsOn, FURTHER_SUBJECTS } from '@/features/board/subjects';
import { CAUTIONS } from '@/shared/rules';
import { CAUTION_SUBJECTS } from '@/shared/rules/caution';
import { SOURCES } from '@/shared/rules/sources';

import { serve, showInShop } from '../../support/in-shop';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

it('posts every caution once, under its subject, in the order of the rules', () => {
  const posted = CAUTION_SUBJECTS.flatMap(cautionsOn).map(({ id }) => id);
  expect([...posted].sort()).toEqual(Object.keys(CAUTIONS).sort());
  expect(new Set(posted).size).toBe(posted.length);
  expect(FURTHER_SUBJECTS).toHaveLength(CAUTION_SUBJECTS.length - 1);
});

it('shows the words and the source of each, and that the marking comes first', () => {
  serve(() => ({ body: {} }));
  showInShop(<BoardScreen />);
  const words = document.body.textContent ?? '';
  for (const caution of Object.values(CAUTIONS)) {
    expect(words).toContain(caution.words);
    expect(words).toContain(SOURCES[caution.source].title);
  }
  expect(words.indexOf(CAUTIONS['marking-first'].words)).toBeLessThan(
    words.indexOf(CAUTIONS['look-and-ring'].words),
  );
  expect(screen.queryByText(/have read/i)).toBeNull();
});
