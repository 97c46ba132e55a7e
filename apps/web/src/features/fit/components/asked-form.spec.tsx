import type { SetDocument } from '@settlewright/geometry';
import { fireEvent, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { facingBenches, showSheet } from '../test/show-sheet.tsx';
import { AskedForm } from './asked-form.tsx';

describe('what a set says of itself', () => {
  const open = async () => {
    const ask = vi.fn();
    const user = userEvent.setup();
    showSheet(<AskedForm />, { asked: facingBenches.asked, ask });
    await user.click(screen.getByRole('button', { name: 'What this set asks' }));
    return { ask, user };
  };

  it('takes the height of the lens when the field is left', async () => {
    const { ask, user } = await open();
    const field = screen.getByLabelText(/^Height of the lens/);
    await user.type(field, '3 6');
    expect(ask).not.toHaveBeenCalled();
    await user.clear(field);
    await user.type(field, '42');
    fireEvent.blur(field);
    expect(ask.mock.calls).toEqual([[{ ...facingBenches.asked, lensHeightMm: 42 * 25.4 }]]);
  });

  it('is not shown to those who change nothing', () => {
    showSheet(<AskedForm />, { asked: facingBenches.asked });
    expect(screen.queryByRole('button')).toBeNull();
  });
});

describe('what a set asks of its floor', () => {
  const open = async (asked: Partial<SetDocument['asked']> = {}) => {
    const ask = vi.fn<(asked: SetDocument['asked'], doing?: string) => void>();
    const user = userEvent.setup();
    const document = { ...facingBenches, asked: { ...facingBenches.asked, ...asked } };
    const { container } = showSheet(<AskedForm />, { document, asked: document.asked, ask });
    await user.click(screen.getByRole('button', { name: 'What this set asks' }));
    const said = () => ask.mock.calls.at(-1);
    return { container, said, user };
  };
  const route = [
    { xMm: 0, zMm: 0 },
    { xMm: 1000, zMm: 0 },
    { xMm: 1000, zMm: 2000 },
  ];

  it('begins a route between two pieces that are named', async () => {
    const { said, user } = await open();
    await user.click(screen.getByRole('button', { name: 'Between these two' }));
    const [first, second] = facingBenches.pieces;
    expect(said()?.[0].route).toHaveLength(2);
    expect(said()?.[1]).toBe(`Route between ${first?.mark ?? ''} and ${second?.mark ?? ''}`);
    await user.click(screen.getByRole('button', { name: 'From end to end of the plan' }));
    expect(said()?.[1]).toBe('Route from end to end');
  });

  it('moves, swaps, adds and removes corners by its rows, one named step each', async () => {
    const { said, user } = await open({ route });
    const across = screen.getByLabelText('Corner 2 across');
    await user.clear(across);
    await user.type(across, '-10');
    fireEvent.blur(across);
    expect(said()).toMatchObject([
      { route: [route[0], { xMm: -254, zMm: 0 }, route[2]] },
      'Route corner 2 moved',
    ]);
    await user.click(screen.getByRole('button', { name: 'Move corner 2 up' }));
    expect(said()).toMatchObject([{ route: [route[1], route[0], route[2]] }, 'Route corner 2 up']);
    await user.click(screen.getByRole('button', { name: 'Remove corner 1' }));
    expect(said()).toMatchObject([{ route: [route[1], route[2]] }, 'Route corner 1 removed']);
    await user.click(screen.getByRole('button', { name: 'Add a corner' }));
    expect(said()).toMatchObject([{ route: [...route, { xMm: 1000, zMm: 3000 }] }, 'Route corner 4 added']);
    await user.click(screen.getByRole('button', { name: 'Take the route away' }));
    expect(said()?.[0]).not.toHaveProperty('route');
  });

  it('keeps the two corners that a route needs', async () => {
    await open({ route: route.slice(0, 2) });
    expect(screen.getByRole('button', { name: 'Remove corner 1' })).toBeDisabled();
  });

  it('takes a press on the plan as a corner where the route grows least, and a drag as a move', async () => {
    const { container, said } = await open({ route });
    const svg = container.querySelector('[data-plan] svg') as SVGSVGElement;
    const [x = 0, z = 0, width = 0, height = 0] = (svg.getAttribute('viewBox') ?? '').split(' ').map(Number);
    // As if the plan stood at one pixel for ten millimetres.
    svg.getBoundingClientRect = () => new DOMRect(0, 0, width / 10, height / 10);
    const at = (xMm: number, zMm: number) => ({ clientX: (xMm - x) / 10, clientY: (zMm - z) / 10 });
    fireEvent.click(svg, at(508, 50.8));
    expect(said()).toMatchObject([
      { route: [route[0], { xMm: 508, zMm: 50.8 }, route[1], route[2]] },
      'Route corner 2 added',
    ]);
    const handle = within(svg as unknown as HTMLElement)
      .getByText('3')
      .closest('g') as SVGGElement;
    handle.setPointerCapture = () => undefined;
    fireEvent.pointerDown(handle, { pointerId: 1, ...at(1000, 2000) });
    fireEvent.pointerMove(handle, { pointerId: 1, ...at(508, 2032) });
    fireEvent.pointerUp(handle, { pointerId: 1, ...at(508, 2032) });
    fireEvent.click(handle, at(508, 2032));
    expect(said()).toMatchObject([
      { route: [route[0], route[1], { xMm: 508, zMm: 2032 }] },
      'Route corner 3 moved',
    ]);
  });

  it('marks a spot for turning round in the middle of the plan', async () => {
    const { said, user } = await open();
    await user.click(screen.getByRole('button', { name: 'Mark a spot' }));
    expect(said()).toMatchObject([{ turningAt: {} }, 'Turning space marked']);
  });

  it('draws the turning circle of the rule to scale', async () => {
    const { container } = await open({ turningAt: { xMm: 100, zMm: 200 } });
    const drawn = [...container.querySelectorAll('[data-plan] svg > circle')];
    expect(drawn.map((circle) => circle.getAttribute('r'))).toEqual(['762']);
  });
});
