import { quantityHint, quantityText, readEntry, type QuantitySpec } from '@/features/forms';

const width: QuantitySpec = { label: 'Width', unit: 'mm', limit: 'wheelWidthMm' };
const jaws: QuantitySpec = { label: 'Jaws', unit: '1', limit: 'jawCount', whole: true };

describe('readEntry', () => {
  it.each([
    ['1 1/4', 'inch', 31.75],
    ['0,5', 'inch', 12.7],
    ['0.5in', 'mm', 12.7],
    ['12 mm', 'inch', 12],
    ['25', 'mm', 25],
  ] as const)('reads %s typed by a reader of %s', (text, system, si) => {
    expect(readEntry(text, width, system)).toEqual({ si: expect.closeTo(si, 10) });
  });

  it('takes nothing as no answer, not as an error', () => {
    expect(readEntry('  ', width, 'mm')).toEqual({ si: null });
  });

  it.each(['abc', '0', '-3', '1e400', '12 rpm'])('refuses %s and names the field', (text) => {
    const { si, error } = readEntry(text, width, 'mm');
    expect(si).toBeNull();
    expect(error).toContain('Width');
  });

  it('names the range in the reader’s own unit, no wider than it is', () => {
    expect(readEntry('400', width, 'mm').error).toBe('Width is from 0.5 to 300\u00a0mm.');
    const inches = readEntry('40', width, 'inch').error ?? '';
    expect(inches).toBe('Width is from 0.0197 to 11.811\u00a0in.');
    expect(readEntry('11.811', width, 'inch').si).not.toBeNull();
    expect(readEntry('0.0197', width, 'inch').si).not.toBeNull();
  });

  it('takes whole numbers only where it counts', () => {
    expect(readEntry('3', jaws, 'mm')).toEqual({ si: 3 });
    expect(readEntry('3.5', jaws, 'mm').error).toContain('whole number');
  });
});

describe('quantityText', () => {
  it('says the same words as the field', async () => {
    const rule = quantityText({ spec: width, system: 'mm' });
    await expect(rule.validate('abc')).rejects.toThrow(readEntry('abc', width, 'mm').error);
    await expect(rule.validate('')).resolves.toBe('');
  });

  it('asks for what is required', async () => {
    const rule = quantityText({ spec: width, system: 'mm', required: true });
    await expect(rule.validate('')).rejects.toThrow('Enter width');
  });
});

it('says what a field wants before any mistake', () => {
  expect(quantityHint(width, 'mm')).toBe('0.5 to 300\u00a0mm');
});
