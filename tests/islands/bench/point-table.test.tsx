import { cleanup, fireEvent, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { blank, showBenchOf, type } from './bench-of-one';

afterEach(cleanup);

const cell = (name: string) => screen.getByLabelText<HTMLInputElement>(name);
const sketch = () => screen.getByRole('img', { name: /^(Outline|Section)/ });

function typeIn(name: string, text: string) {
  fireEvent.focus(cell(name));
  fireEvent.change(cell(name), { target: { value: text } });
  fireEvent.blur(cell(name));
}

function paste(name: string, text: string) {
  fireEvent.paste(cell(name), { clipboardData: { getData: () => text } });
}

describe('profile of a prism', () => {
  it('types every cell, a radius left empty being a sharp corner, in the working unit', () => {
    const bench = showBenchOf(blank('prism'), 'cm');
    expect(cell('profile, point 2, x').value).toBe('60');
    typeIn('profile, point 2, x', '58 cm');
    typeIn('profile, point 2, radius', '25 mm');
    expect(bench.solid('prism').profile[1]).toEqual([580, 120, 25]);
    expect(cell('profile, point 2, radius').value).toBe('2.5');
    typeIn('profile, point 2, radius', '');
    expect(bench.solid('prism').profile[1]).toEqual([580, 120]);
    expect(bench.undoNames()).toEqual(['point 2 of part', 'point 2 of part', 'point 2 of part']);
  });

  it('draws the outline with its points numbered and marks the chosen one', () => {
    showBenchOf(blank('prism'));
    expect(sketch().getAttribute('aria-label')).toBe('Outline of part: 5 points');
    fireEvent.focus(cell('profile, point 4, z'));
    expect(sketch().getAttribute('aria-label')).toBe('Outline of part: 5 points, point 4 chosen');
    const numbers = [...sketch().querySelectorAll('text')];
    expect(numbers.map(({ textContent }) => textContent)).toEqual(['1', '2', '3', '4', '5']);
    // the path ends where the numbers say: point 1 is the keel, lowest of all
    const heights = [...sketch().querySelectorAll('circle')].map((c) =>
      Number(c.getAttribute('cy')),
    );
    expect(Math.max(...heights)).toBe(heights[0]);
  });

  it('keeps what cannot be read in its cell with a sentence, and takes nothing of it', () => {
    const bench = showBenchOf(blank('prism'));
    typeIn('profile, point 3, z', 'deep');
    expect(cell('profile, point 3, z').value).toBe('deep');
    expect(cell('profile, point 3, z').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByRole('alert').textContent).toMatch(/^z: “deep” is not a unit of length/);
    typeIn('profile, point 3, x', '');
    expect(screen.getAllByRole('alert').map(({ textContent }) => textContent)).toContain(
      'x: Type a number.',
    );
    expect(bench.solid('prism')).toEqual(blank('prism'));
    // it goes along with its row
    fireEvent.click(
      screen.getByRole('button', { name: 'add a point after point 1 of the profile' }),
    );
    expect(cell('profile, point 4, z').value).toBe('deep');
    fireEvent.keyDown(cell('profile, point 4, z'), { key: 'Escape' });
    expect(cell('profile, point 4, z').value).toBe('300');
  });

  it('walks by arrows up and down and goes on with Enter, taking over what was typed once', () => {
    const bench = showBenchOf(blank('prism'));
    cell('profile, point 1, x').focus();
    fireEvent.change(cell('profile, point 1, x'), { target: { value: '310' } });
    fireEvent.keyDown(cell('profile, point 1, x'), { key: 'ArrowDown' });
    expect(document.activeElement).toBe(cell('profile, point 2, x'));
    expect(bench.solid('prism').profile[0]).toEqual([310, 0]);
    expect(bench.undoNames()).toEqual(['point 1 of part']);
    fireEvent.keyDown(cell('profile, point 2, x'), { key: 'Enter' });
    expect(document.activeElement).toBe(cell('profile, point 2, z'));
    fireEvent.keyDown(cell('profile, point 2, z'), { key: 'Enter' });
    fireEvent.keyDown(cell('profile, point 2, radius'), { key: 'Enter' });
    expect(document.activeElement).toBe(cell('profile, point 3, x'));
    fireEvent.keyDown(cell('profile, point 3, x'), { key: 'ArrowUp' });
    expect(document.activeElement).toBe(cell('profile, point 2, x'));
    // Enter does not leave a cell that cannot be read
    fireEvent.change(cell('profile, point 2, x'), { target: { value: 'x' } });
    fireEvent.keyDown(cell('profile, point 2, x'), { key: 'Enter' });
    expect(document.activeElement).toBe(cell('profile, point 2, x'));
  });

  it('adds and removes points, never fewer than three', () => {
    const bench = showBenchOf(blank('prism'));
    const remove = () =>
      screen.getByRole<HTMLButtonElement>('button', { name: 'remove point 2 of the profile' });
    fireEvent.click(remove());
    fireEvent.click(remove());
    expect(bench.solid('prism').profile).toEqual([
      [300, 0],
      [0, 300],
      [0, 120],
    ]);
    expect(remove().disabled).toBe(true);
  });

  it('takes columns of a spreadsheet from a cell on, and says what is no number', () => {
    const bench = showBenchOf(blank('prism'));
    paste('profile, point 1, x', '300\t0\r\n600\t500\t40\r\n0\t500\r\n');
    expect(bench.solid('prism').profile).toEqual([
      [300, 0],
      [600, 500, 40],
      [0, 500],
    ]);
    expect(bench.undoNames()).toEqual(['points of part']);
    // one column, further in: only that column, the points after it stay
    paste('profile, point 2, z', '450\n450.5');
    expect(bench.solid('prism').profile).toEqual([
      [300, 0],
      [600, 450, 40],
      [0, 450.5],
    ]);
    const before = bench.solid('prism');
    for (const [text, sentence] of [
      ['300,0\n600,high', /z in line 2 of what was pasted is “high”/],
      ['1,2,3,4', /line 1 of what was pasted has 4 columns/],
      ['300\t\n600\t500\n0\t500', /z in line 1 of what was pasted is empty/],
      ['300\t0\n600\t500', /that would make 2 points/],
    ] as const) {
      paste('profile, point 1, x', text);
      expect(screen.getByRole('alert').textContent).toMatch(sentence);
      expect(bench.solid('prism')).toBe(before);
    }
    paste('profile, point 3, z', '1\n2');
    expect(screen.getByRole('alert').textContent).toMatch(/line 2 of what was pasted has no x/);
  });

  it('shows a fault of the engine at its cell', () => {
    showBenchOf({
      ...blank('prism'),
      profile: [
        [300, 0],
        [600, 500],
        [0, 500, 900],
      ],
    });
    const radius = cell('profile, point 3, radius');
    expect(radius.getAttribute('aria-invalid')).toBe('true');
    const described = document.getElementById(radius.getAttribute('aria-describedby')!);
    expect(described?.textContent).toMatch(/a radius of 900 mm does not fit/);
    expect(cell('profile, point 2, radius').getAttribute('aria-invalid')).toBe('false');
  });
});

describe('stations of a hull', () => {
  it('has a table a station, named for assistive technology, and its x', () => {
    const bench = showBenchOf(blank('stations'));
    typeIn('station 3, point 5, z', '250');
    expect(bench.solid('stations').stations[2]!.profile[4]).toEqual([-60, 250]);
    type(screen.getByLabelText('station 2 x'), '650');
    expect(bench.solid('stations').stations[1]!.x).toBe(650);
    expect(bench.undoNames()).toEqual(['station 3, point 5 of part', 'station 2 x of part']);
    fireEvent.focus(cell('station 2, point 3, y'));
    expect(sketch().getAttribute('aria-label')).toBe(
      'Section at station 2 of part: 5 points, point 3 chosen',
    );
  });

  it('adds a station beyond the last and removes it, and points in every station', () => {
    const bench = showBenchOf(blank('stations'));
    fireEvent.click(screen.getByRole('button', { name: 'Add a station' }));
    expect(bench.solid('stations').stations.map(({ x }) => x)).toEqual([0, 600, 1200, 1800]);
    fireEvent.click(screen.getByRole('button', { name: 'remove station 4' }));
    expect(bench.solid('stations')).toEqual(blank('stations'));
    fireEvent.click(
      screen.getByRole('button', {
        name: 'add a point after point 1 of the station 2, in every station',
      }),
    );
    expect(bench.solid('stations').stations.map(({ profile }) => profile.length)).toEqual([
      6, 6, 6,
    ]);
  });

  it('says at the station that it has not as many points as the first', () => {
    const bench = showBenchOf(blank('stations'));
    paste('station 2, point 1, y', '0,0\n250,300\n-250,300');
    expect(bench.solid('stations').stations[1]!.profile).toHaveLength(3);
    const station = screen.getByRole('region', { name: 'station 2' });
    expect(station.textContent).toMatch(/station 2 has 3 points and station 1 has 5/);
  });
});
