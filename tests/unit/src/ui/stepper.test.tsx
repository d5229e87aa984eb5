import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { readNumber, Stepper } from '#src/ui/stepper.js';
import { renderOnBoard } from '#tests/support/on-board.js';

function Height({ step = 0.1, start = 0.2, max = 60 }: { step?: number; start?: number; max?: number }) {
  const [value, setValue] = useState(start);
  return (
    <Stepper
      label="Height above level"
      value={value}
      onChange={setValue}
      min={-5}
      max={max}
      step={step}
      format={(degrees) => `${degrees}°`}
    />
  );
}

const field = () => screen.getByRole<HTMLInputElement>('spinbutton', { name: 'Height above level' });

describe('a stepper', () => {
  it('steps by its buttons and does not drift', async () => {
    const { user } = await renderOnBoard(<Height />);
    await user.click(screen.getByRole('button', { name: 'One more' }));
    expect(field().value).toBe('0.3°');
  });

  it('steps by the arrow keys, in tens by the page keys, and stops at its ends', async () => {
    const { user } = await renderOnBoard(<Height step={1} start={55} />);
    await user.click(field());
    await user.keyboard('{ArrowUp}{PageUp}');
    expect(field().getAttribute('aria-valuenow')).toBe('60');
    expect(screen.getByRole('button', { name: 'One more' }).getAttribute('aria-disabled')).toBe('true');
    await user.keyboard('{Home}');
    expect(field().getAttribute('aria-valuenow')).toBe('-5');
  });

  it('takes a typed number when the field is left, and holds it within the ends', async () => {
    const { user } = await renderOnBoard(<Height />);
    await user.clear(field());
    await user.type(field(), '3,5');
    await user.tab();
    expect(field().value).toBe('3.5°');
    await user.clear(field());
    await user.type(field(), '99{Enter}');
    expect(field().value).toBe('60°');
  });

  it('keeps its value when what was typed is no number', async () => {
    const { user } = await renderOnBoard(<Height />);
    await user.clear(field());
    await user.type(field(), 'thirty');
    await user.tab();
    expect(field().value).toBe('0.2°');
  });
});

describe('a typed number', () => {
  it('may have a comma, a unit, spaces and a true minus', () => {
    expect(readNumber('−3,5°')).toBe(-3.5);
    expect(readNumber('1 950 m')).toBe(1950);
    expect(readNumber('7 days')).toBe(7);
    expect(readNumber('')).toBeNull();
  });
});
