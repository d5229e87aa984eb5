import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { ProgressPegs } from '#src/ui/pegs.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const holes = () => screen.getByRole('img').querySelectorAll('.pic-hole');
const full = () => screen.getByRole('img').querySelectorAll('.pic-hole.full');

describe('progress along a row of holes', () => {
  it('has a hole for each entry and fills what is done', async () => {
    await renderOnBoard(
      <ProgressPegs total={10} current={3} isDone={(index) => index < 3} label="4 of 10" />,
    );
    expect(holes()).toHaveLength(10);
    expect(full()).toHaveLength(3);
    expect(screen.getByRole('img', { name: '4 of 10' }).querySelectorAll('.pic-peg')).toHaveLength(1);
  });

  it('shares holes among very many, and fills one only when all its entries are done', async () => {
    await renderOnBoard(
      <ProgressPegs total={150} current={null} isDone={(index) => index !== 149} label="nearly" />,
    );
    expect(holes()).toHaveLength(60);
    expect(full()).toHaveLength(59);
  });
});
