import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';

import { Button } from '@/features/ui/button';
import { Checkbox } from '@/features/ui/checkbox';
import { ErrorSummary } from '@/features/ui/error-summary';
import { Field } from '@/features/ui/field';
import { FieldScopeProvider, useFieldIdsOf } from '@/features/ui/field-ids';
import { Fold } from '@/features/ui/fold';
import { RadioRows } from '@/features/ui/radio-row';
import { Segmented } from '@/features/ui/segmented';

describe('a field', () => {
  function Diameter({ error }: { error?: string }) {
    const [value, setValue] = useState('');
    return (
      <Field
        name="wheel.diameterMm"
        label="Wheel diameter, new"
        value={value}
        onChangeText={setValue}
        unit="mm"
        spokenUnit="millimetres"
        hint="From 2 to 1 000 mm"
        error={error}
        inputMode="decimal"
      />
    );
  }

  it('is named by its label and described by unit and hint', () => {
    render(<Diameter />);
    const input = screen.getByRole('textbox', { name: 'Wheel diameter, new' });
    expect(input).toHaveAccessibleDescription('in millimetres From 2 to 1 000 mm');
    expect(input).not.toHaveAttribute('aria-invalid');
  });

  it('ties an error to its input and keeps the hint', () => {
    render(<Diameter error="Wheel diameter must be from 2 to 1 000 mm." />);
    const input = screen.getByLabelText('Wheel diameter, new');
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription(
      'in millimetres From 2 to 1 000 mm Wheel diameter must be from 2 to 1 000 mm.',
    );
  });

  it('keeps what is typed, readable or not', async () => {
    render(<Diameter />);
    const input = screen.getByLabelText('Wheel diameter, new');
    await userEvent.type(input, '1 1/4 inxx');
    expect(input).toHaveValue('1 1/4 inxx');
  });

  it('takes the focus when its label is pressed', async () => {
    render(<Diameter />);
    await userEvent.click(screen.getByText('Wheel diameter, new'));
    expect(screen.getByLabelText('Wheel diameter, new')).toHaveFocus();
  });

  it('shows a secret only on demand', async () => {
    render(<Field name="password" label="Password" value="x" onChangeText={() => {}} secret />);
    const input = screen.getByLabelText('Password');
    expect(input).toHaveAttribute('type', 'password');
    await userEvent.click(screen.getByRole('button', { name: 'Show the Password' }));
    expect(input).not.toHaveAttribute('type', 'password');
  });
});

describe('an error summary', () => {
  function Form() {
    const [attempt, setAttempt] = useState(0);
    const idsOf = useFieldIdsOf();
    const errors = [{ fieldId: idsOf('bore').input, message: 'Bore must be from 1 to 2 000 mm.' }];
    return (
      <>
        <ErrorSummary errors={attempt > 0 ? errors : []} attempt={attempt} />
        <Field name="bore" label="Bore at jaws" value="-3" onChangeText={() => {}} />
        <Button label="Save" onPress={() => setAttempt(attempt + 1)} />
      </>
    );
  }

  it('takes the focus at each attempt and leads to the field', async () => {
    render(
      <FieldScopeProvider scope="setup">
        <Form />
      </FieldScopeProvider>,
    );
    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    const summary = screen.getByRole('region', { name: 'One thing to put right' });
    expect(summary).toHaveFocus();

    await userEvent.click(screen.getByRole('link', { name: 'Bore must be from 1 to 2 000 mm.' }));
    expect(screen.getByLabelText('Bore at jaws')).toHaveFocus();

    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(summary).toHaveFocus();
  });
});

describe('choices', () => {
  const OPTIONS = [
    { value: 'a', label: 'Post grinder A', lockedBecause: 'Hole 10 mm, arbor 12.7: does not fit.' },
    { value: 'b', label: 'Post grinder B' },
    { value: 'c', label: 'Post grinder C' },
  ] as const;

  function Grinders({ onChange }: { onChange: (value: string) => void }) {
    const [value, setValue] = useState<'a' | 'b' | 'c' | null>('b');
    return (
      <RadioRows
        name="grinder"
        label="Grinder"
        options={OPTIONS}
        value={value}
        onChange={(next) => {
          setValue(next);
          onChange(next);
        }}
      />
    );
  }

  it('are one stop for the tab key; arrows choose', async () => {
    const onChange = jest.fn();
    render(<Grinders onChange={onChange} />);
    await userEvent.tab();
    expect(screen.getByRole('radio', { name: /Post grinder B/ })).toHaveFocus();
    await userEvent.keyboard('{ArrowDown}');
    const next = screen.getByRole('radio', { name: /Post grinder C/ });
    expect(next).toHaveFocus();
    expect(next).toBeChecked();
    expect(onChange.mock.calls).toEqual([['c']]);
  });

  it('reach a locked row, read its reason, and never choose it', async () => {
    const onChange = jest.fn();
    render(<Grinders onChange={onChange} />);
    await userEvent.tab();
    await userEvent.keyboard('{ArrowUp}');
    const locked = screen.getByRole('radio', { name: /does not fit/ });
    expect(locked).toHaveFocus();
    expect(locked).toHaveAttribute('aria-disabled', 'true');
    await userEvent.keyboard(' ');
    fireEvent.click(locked);
    expect(locked).not.toBeChecked();
    expect(onChange).not.toHaveBeenCalled();
  });

  it('side by side are a named group', async () => {
    const onChange = jest.fn();
    render(
      <Segmented
        name="spindle"
        label="Spindle"
        value={null}
        onChange={onChange}
        options={[
          { value: 'rpm', label: 'rpm' },
          { value: 'pulleys', label: 'motor and pulleys' },
        ]}
      />,
    );
    expect(screen.getByRole('radiogroup', { name: 'Spindle' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('radio', { name: 'motor and pulleys' }));
    expect(onChange).toHaveBeenCalledWith('pulleys');
  });
});

describe('a checkbox', () => {
  it('answers to touch and to the space bar', async () => {
    const onChange = jest.fn();
    render(<Checkbox name="shield" label="A shield stands" checked={false} onChange={onChange} />);
    const box = screen.getByRole('checkbox', { name: 'A shield stands' });
    await userEvent.click(box);
    await userEvent.keyboard(' ');
    expect(onChange.mock.calls).toEqual([[true], [true]]);
  });
});

describe('a button', () => {
  it('refuses a second press while it is busy', async () => {
    const onPress = jest.fn();
    render(<Button label="Save" busy onPress={onPress} />);
    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(onPress).not.toHaveBeenCalled();
  });
});

describe('a fold', () => {
  it('holds its value in its title and opens in place', async () => {
    render(
      <Fold label="All limits" value="marking, quill 24 700">
        <Button label="Inside" />
      </Fold>,
    );
    const title = screen.getByRole('button', { name: /All limits.*marking, quill 24 700/ });
    expect(title).toHaveAttribute('aria-expanded', 'false');
    expect(screen.queryByRole('button', { name: 'Inside' })).toBeNull();
    await userEvent.click(title);
    expect(title).toHaveAttribute('aria-expanded', 'true');
    expect(screen.getByRole('button', { name: 'Inside' })).toBeInTheDocument();
  });
});
