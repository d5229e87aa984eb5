import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { NIGHT_STATES, type NightState } from '#shared/sky/vocabulary.js';
import { laneBox, YearLane } from '#src/ui/pictures/year-lane.js';

const span = { first: 1, last: 100 };

function bands(state: NightState): (readonly [number, number])[] {
  const view = render(
    <YearLane
      span={span}
      segments={[{ state, fromDayNumber: 1, toDayNumber: 100 }]}
      label={state}
      height={103}
    />,
  );
  const found = [...screen.getByRole('img', { name: state }).querySelectorAll('.pic-seen')].map(
    (band) =>
      [
        Number(band.getAttribute('y')),
        Number(band.getAttribute('y')) + Number(band.getAttribute('height')),
      ] as const,
  );
  view.unmount();
  return found.map(([from, to]) => [Math.round(from), Math.round(to)] as const);
}

describe('a lane of nights', () => {
  it('tells each state by place alone: the night runs down from dusk to dawn', () => {
    expect(bands('after-dusk')).toEqual([[0, 50]]);
    expect(bands('before-dawn')).toEqual([[50, 100]]);
    expect(bands('all-night')).toEqual([[0, 100]]);
    const [middle] = bands('rises-and-sets-in-night');
    expect(middle?.[0]).toBeGreaterThan(0);
    expect(middle?.[1]).toBeLessThan(100);
    const [top, foot] = bands('dusk-and-dawn');
    expect(top?.[0]).toBe(0);
    expect(foot?.[1]).toBe(100);
    expect(top?.[1]).toBeLessThan(foot?.[0] ?? 0);
    expect(bands('hidden')).toEqual([]);
  });

  it('shows no two states alike', () => {
    const shapes = NIGHT_STATES.map((state) => JSON.stringify(bands(state)));
    expect(new Set(shapes).size).toBe(NIGHT_STATES.length);
  });

  it('draws a state of one night in front of its neighbours', () => {
    const segments = [
      { state: 'after-dusk' as const, fromDayNumber: 1, toDayNumber: 50 },
      { state: 'hidden' as const, fromDayNumber: 51, toDayNumber: 51 },
      { state: 'before-dawn' as const, fromDayNumber: 52, toDayNumber: 100 },
    ];
    render(<YearLane span={span} segments={segments} label="short" />);
    const hidden = screen.getByRole('img').querySelector('.pic-hidden');
    const drawn = [...screen.getByRole('img').querySelectorAll('.pic-hidden, .pic-seen')];
    expect(drawn.at(-1)).toBe(hidden);
  });

  it('keeps every state at least four pixels wide and inside the picture', () => {
    expect(laneBox({ start: 50, width: 1 }, false)).toEqual({
      x: 'min(calc(50% + 1.5px), calc(100% - 4px))',
      width: 'max(4px, calc(1% - 1.5px))',
    });
    expect(laneBox({ start: 0, width: 30 }, true).width).toBe('max(4px, calc(30% - 0px))');
  });

  it('has a peg for today only inside its year', () => {
    const view = render(<YearLane span={span} segments={[]} label="lane" today={101} />);
    expect(screen.getByRole('img').querySelector('.pic-peg')).toBeNull();
    view.rerender(<YearLane span={span} segments={[]} label="lane" today={100} />);
    expect(screen.getByRole('img').querySelector('.pic-peg')).not.toBeNull();
  });
});
