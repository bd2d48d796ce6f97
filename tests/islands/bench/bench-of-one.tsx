import { fireEvent, render } from '@testing-library/react';
import { useReducer } from 'react';
import { startingSettings } from '~/domain/tank/complete-settings';
import type { TankDocument } from '~/domain/tank/document';
import { kindOf, kinds, type Solid } from '~/domain/tank/kinds/registry';
import type { TankSettings } from '~/domain/tank/settings';
import type { LengthUnit } from '~/domain/units/length-unit';
import { SolidFields } from '~/islands/bench/SolidFields';
import { newScene, sceneReducer, type Scene } from '~/scene/scene';

interface Seen {
  scene: Scene;
  settings: TankSettings;
}

export function blank<K extends Solid['kind']>(kind: K): Extract<Solid, { kind: K }> {
  return kinds.find((one) => one.kind === kind)!.blank('part') as Extract<Solid, { kind: K }>;
}

/** The fields of one solid over a real scene, its faults those of its kind; what became of it can be asked. */
export function showBenchOf(first: Solid, unit: LengthUnit = 'mm') {
  const document: TankDocument = {
    format: 'dipwright-tank',
    version: 1,
    name: 'Tank',
    solids: [first],
  };
  let seen: Seen | null = null;
  function Fields() {
    const [scene, dispatch] = useReducer(sceneReducer, document, newScene);
    const [settings, change] = useReducer(
      (now: TankSettings, part: Partial<TankSettings>) => ({ ...now, ...part }),
      startingSettings('diesel'),
    );
    seen = { scene, settings };
    const solid = scene.history.present.solids[0]!;
    return (
      <SolidFields
        solid={solid}
        document={scene.history.present}
        dispatch={dispatch}
        unit={unit}
        settings={settings}
        onSettings={change}
        faults={kindOf(solid)
          .faults(solid)
          .map(({ path, detail }) => ({ pointer: `/${path.join('/')}`, detail }))}
      />
    );
  }
  render(<Fields />);
  return {
    solid: <K extends Solid['kind']>(_kind: K) =>
      seen!.scene.history.present.solids[0] as Extract<Solid, { kind: K }>,
    settings: () => seen!.settings,
    undoNames: () => seen!.scene.history.past.map(({ name }) => name),
  };
}

/** Types into a field and leaves it with Enter, as TypedNumber takes it. */
export function type(field: HTMLElement, text: string) {
  fireEvent.change(field, { target: { value: text } });
  fireEvent.keyDown(field, { key: 'Enter' });
}
