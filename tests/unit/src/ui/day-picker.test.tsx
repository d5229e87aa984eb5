import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { DayPicker } from '#src/ui/day-picker.js';
import { renderOnBoard } from '#tests/support/on-board.js';

function Picker({ start = '2027-06-14' }: { start?: string }) {
  const [day, setDay] = useState(start);
  return (
    <>
      <DayPicker label="Fixed date" value={day} onChange={setDay} min="2027-01-05" max="2027-12-31" />
      <p title="picked">{day}</p>
    </>
  );
}

const picked = () => screen.getByTitle('picked').textContent;

describe('picking a day', () => {
  it('puts the peg into the hole that was pressed', async () => {
    const { user } = await renderOnBoard(<Picker />);
    await user.click(screen.getByRole('button', { name: 'Monday, 7 June 2027' }));
    expect(picked()).toBe('2027-06-07');
    expect(screen.getByRole('button', { name: 'Monday, 7 June 2027' }).getAttribute('aria-pressed')).toBe(
      'true',
    );
  });

  it('works by keyboard over the edge of a month', async () => {
    const { user } = await renderOnBoard(<Picker start="2027-06-30" />);
    screen.getByRole('button', { name: 'Wednesday, 30 June 2027' }).focus();
    await user.keyboard('{ArrowRight}{ArrowDown}{Enter}');
    expect(picked()).toBe('2027-07-08');
  });

  it('holds on to the last day where the next month is shorter', async () => {
    const { user } = await renderOnBoard(<Picker start="2027-01-31" />);
    screen.getByRole('button', { name: 'Sunday, 31 January 2027' }).focus();
    await user.keyboard('{PageDown}{Enter}');
    expect(picked()).toBe('2027-02-28');
  });

  it('leaves days outside its bounds alone', async () => {
    const { user } = await renderOnBoard(<Picker start="2027-01-05" />);
    await user.click(screen.getByRole('button', { name: 'Monday, 4 January 2027' }));
    expect(picked()).toBe('2027-01-05');
    expect(screen.getByRole('button', { name: 'The month before' }).getAttribute('aria-disabled')).toBe(
      'true',
    );
  });

  it('begins weeks on Monday', async () => {
    await renderOnBoard(<Picker />);
    // 1 June 2027 is a Tuesday: second column.
    expect(screen.getByRole('button', { name: 'Tuesday, 1 June 2027' }).style.gridColumnStart).toBe('2');
  });
});
