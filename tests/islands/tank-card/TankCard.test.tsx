import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { TankCard } from '~/islands/tank-card/TankCard';
import { cistern, settings } from './sloped-cistern';

afterEach(() => {
  cleanup();
  localStorage.clear();
});

const dip = (text: string) =>
  fireEvent.change(screen.getByRole('textbox'), { target: { value: text } });
const page = () => document.body.textContent!.replaceAll('\u00a0', ' ');

describe('tank card', () => {
  it('asks first and computes nothing', () => {
    render(<TankCard {...cistern} />);
    expect(page()).toContain('How deep is it?');
    expect(page()).not.toMatch(/usable, ±/);
    expect(
      (screen.getByRole('button', { name: 'Keep this reading' }) as HTMLButtonElement).disabled,
    ).toBe(true);
  });

  // worked by hand: 15 + 0.45 · 90 = 55.5 L; 123 − 55.5 = 67.5; 55.5 · 0.998 = 55.4 kg; at 30 mm 4.5, at 300 123.0
  it.each([
    ['150', '55.5 L', '67.5 L room to safe fill', '55 kg'],
    ['15 cm', '55.5 L', '67.5 L room to safe fill', '55 kg'],
    ['2*75', '55.5 L', '67.5 L room to safe fill', '55 kg'],
    ['30', '4.5 L', '118.5 L room to safe fill', '4 kg'],
    ['300', '123.0 L', '0.0 L room to safe fill', '123 kg'],
  ])('%s → %s', (text, usable, room, mass) => {
    render(<TankCard {...cistern} />);
    dip(text);
    expect(page()).toContain(`${usable}usable`);
    expect(page()).toContain('± 0.9');
    expect(page()).toContain(room);
    expect(page()).toContain(mass);
  });

  it('reads inches and eighths and says what was understood: 5 7/8 in = 149.2 mm → 55.2 L', () => {
    render(<TankCard {...cistern} />);
    dip('5 7/8 in');
    // 5.875 · 25.4 = 149.225 mm; 15 + 0.45 · 89.225 = 55.15 L
    expect(page()).toContain('= 149.23 mm');
    expect(page()).toContain('55.2 Lusable');
  });

  it('asks a reading above the brim back instead of computing it', () => {
    render(<TankCard {...cistern} />);
    dip('301');
    expect(screen.getByRole('textbox').getAttribute('aria-invalid')).toBe('true');
    expect(page()).toContain('301 mm is above the brim: the stick ends at 300 mm.');
    expect(page()).not.toMatch(/usable, ±/);
    expect(
      (screen.getByRole('button', { name: 'Keep this reading' }) as HTMLButtonElement).disabled,
    ).toBe(true);
    dip('-1');
    expect(page()).toContain('less than nothing');
    dip('deep');
    expect(page()).not.toMatch(/usable, ±/);
  });

  it('takes the space above: 150 mm down from the top of 300 is 150 mm deep', () => {
    render(<TankCard {...cistern} />);
    fireEvent.click(screen.getByLabelText('space above'));
    dip('100');
    // 200 mm deep: 15 + 0.45 · 140 = 78.0 L
    expect(page()).toContain('78.0 Lusable');
    // the liquid did not move: the same level told the other way
    fireEvent.click(screen.getByLabelText('depth'));
    expect((screen.getByRole('textbox') as HTMLInputElement).value).toBe('200');
    expect(page()).toContain('78.0 Lusable');
  });

  it('moves the wet line by the stick and shows it in the field', () => {
    render(<TankCard {...cistern} />);
    dip('150');
    const stick = screen.getByRole('slider');
    fireEvent.keyDown(stick, { key: 'ArrowUp', shiftKey: true });
    expect((screen.getByRole('textbox') as HTMLInputElement).value).toBe('160');
    // 15 + 0.45 · 100
    expect(page()).toContain('60.0 Lusable');
    expect(stick.getAttribute('aria-valuetext')!.replaceAll('\u00a0', ' ')).toBe(
      '160 mm, 60.0 L usable',
    );
  });

  it('leaves what stands below the outlet out of usable and says when it is above safe fill', () => {
    render(<TankCard {...cistern} settings={{ ...settings, outletMm: 30, safeFillPercent: 90 }} />);
    dip('150');
    // 55.5 − 4.5; 0.9 · 123 = 110.7 safe fill, 55.2 room
    expect(page()).toContain('51.0 Lusable');
    expect(page()).toContain('55.2 L room to safe fill');
    dip('300');
    expect(page()).toContain('12.3 L above safe fill');
  });

  it('puts the room first where a full tank is the emergency', () => {
    render(
      <TankCard
        {...cistern}
        settings={{ ...settings, liquid: 'grey-water', safeFillPercent: 90 }}
      />,
    );
    dip('150');
    expect(page()).toContain('55.2 Lroom to safe fill, ± 0.9');
    expect(page()).toContain('55.5 L in the tank');
    expect(page()).not.toContain('usable,');
  });

  it('shows litres as gallons that say which, and remembers it', () => {
    render(<TankCard {...cistern} />);
    dip('150');
    fireEvent.change(screen.getByLabelText('Volume in'), { target: { value: 'impgal' } });
    // 55.5 / 4.54609 = 12.21; ± 0.20
    expect(page()).toContain('12.21 imp gal');
    cleanup();
    render(<TankCard {...cistern} />);
    expect((screen.getByLabelText('Volume in') as HTMLSelectElement).value).toBe('impgal');
  });
});
