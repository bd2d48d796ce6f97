import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useReducer } from 'react';
import { afterEach, expect, it } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import { WallFields } from '~/islands/bench/WallFields';
import { newScene, sceneReducer } from '~/scene/scene';

afterEach(cleanup);

const tank: TankDocument = {
  format: 'dipwright-tank',
  version: 1,
  name: 'Tank',
  solids: [{ id: 'body', role: 'holds', kind: 'box', length: 912, width: 512, height: 312 }],
};

function Bench({ told }: { told(document: TankDocument): void }) {
  const [scene, dispatch] = useReducer(sceneReducer, tank, newScene);
  told(scene.history.present);
  return (
    <WallFields
      document={scene.history.present}
      dispatch={dispatch}
      length="mm"
      fault={undefined}
    />
  );
}

it('asks, says what counts until it is answered, and makes no thickness up', () => {
  let now = tank;
  render(<Bench told={(document) => (now = document)} />);
  const sizes = screen.getByLabelText<HTMLSelectElement>('Sizes are');
  expect(sizes.value).toBe('');
  expect(screen.getByText('Not told: sizes count as inside.')).toBeTruthy();

  fireEvent.change(sizes, { target: { value: 'outside' } });
  expect(now.wall).toBeUndefined();
  expect(screen.getByText('Type the wall: until then sizes count as inside.')).toBeTruthy();
  const wall = screen.getByLabelText<HTMLInputElement>(/^wall/);
  fireEvent.change(wall, { target: { value: '0.6 cm' } });
  fireEvent.keyDown(wall, { key: 'Enter' });
  expect(now.wall).toEqual({ thickness: 6, sizes: 'outside' });
  expect(screen.queryByText(/count as inside/)).toBeNull();

  // the thickness is kept for the way back
  fireEvent.change(sizes, { target: { value: 'inside' } });
  expect(now.wall).toEqual({ thickness: 6, sizes: 'inside' });
  fireEvent.change(sizes, { target: { value: 'outside' } });
  expect(now.wall).toEqual({ thickness: 6, sizes: 'outside' });
  fireEvent.change(sizes, { target: { value: '' } });
  expect('wall' in now).toBe(false);
});
