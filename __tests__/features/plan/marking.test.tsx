import { fireEvent, render, screen, within } from '@testing-library/react';
import { useState } from 'react';

import { MarkingField, MarkingFold } from '@/features/plan';
import { readMarking } from '@/features/plan/marking-reading';

const positions = (marking: string) => {
  render(<MarkingFold marking={marking} startOpen />);
  return within(screen.getByRole('list', { name: 'Positions of the marking' }))
    .getAllByRole('listitem')
    .map((item) => item.textContent);
};

it('says what each position of a mark means, in the order it is written', () => {
  expect(positions('38A60-K8V')).toEqual([
    "Abrasivealuminium oxide: steel, the maker's kind 3838A",
    'Grainmedium grain60',
    'Grademedium grade, A soft to Z hardK',
    'Structuremedium structure, 0 dense to 16 open8',
    'Bondvitrified bondV',
  ]);
  expect(screen.getByRole('button')).toHaveAccessibleName('What the marking says: 38A 60 K 8 V');
});

it('gives the concentration of diamond and cBN in carats', () => {
  expect(positions('D126 R C100 B')).toContain(
    'Concentration4.4 carats in each cubic centimetreC100',
  );
});

it('says where nothing is legible which positions there are', () => {
  render(<MarkingFold marking={null} startOpen />);
  expect(screen.getByRole('button')).toHaveAccessibleName('What the marking says: nothing legible');
  expect(screen.getByText(/abrasive, grain, grade, structure/)).toBeInTheDocument();
});

it.each([
  ['A 61 K 8 V', /At “61 K 8 V” the grain is expected: .* 46, F60/],
  ['A 60 8 V', /“8 V” the grade is expected: one letter/],
  ['A 60 K 99 V', /“99 V” the structure is expected: a number from 0 dense to 16 open/],
  ['A 60 K 8 X', /“X” the bond is expected: RF, BF, PL, Mg, V, S, E, R, B or O/],
  ['Q 60 K 8 V', /“Q 60 K 8 V” the abrasive is expected: A or C/],
  ['D127 R100 B', /“127 R100 B” the grain is expected: a size in µm/],
  ['B126 R999 V', /“999 V” the concentration is expected: .* at most 240/],
  ['B126 R C100 X', /“X” the bond is expected: V, B, R, M or G/],
])('names the position at fault in %s and what belongs there', (text, words) => {
  expect(readMarking(text)?.fault).toMatch(words);
});

it.each([
  ['A', /Next comes the grain/],
  ['A 60', /Next comes the grade/],
  ['A 60 K', /Next comes the bond/],
  ['B126 C100', /Next comes the bond: V, B, R, M or G/],
])('takes %s for unfinished, not for wrong', (text, words) => {
  expect(readMarking(text)).toMatchObject({ fault: null, next: expect.stringMatching(words) });
});

function Form() {
  const [text, setText] = useState('');
  return <MarkingField name="marking" value={text} onChangeText={setText} />;
}

it('keeps in its field what does not read, and says what is wrong there', () => {
  render(<Form />);
  const field = screen.getByLabelText('Marking', { selector: 'input' });
  fireEvent.change(field, { target: { value: 'A 6' } });
  expect(field).toHaveValue('A 6');
  fireEvent.change(field, { target: { value: 'A 60 K 8 V' } });
  expect(field).not.toHaveAttribute('aria-invalid');
  fireEvent.change(field, { target: { value: 'A 60 K 8 W' } });
  expect(field).toHaveValue('A 60 K 8 W');
  expect(field).toHaveAttribute('aria-invalid', 'true');
  expect(field).toHaveAccessibleDescription(/At “W” the bond is expected/);
});
