import { Canvas, useThree } from '@react-three/fiber';
import { useEffect, useMemo } from 'react';
import {
  BackSide,
  BufferAttribute,
  BufferGeometry,
  DoubleSide,
  FrontSide,
  Mesh,
  Vector2,
  type Material,
  type Object3D,
} from 'three';
import type { Preview, TankMesh } from '~/domain/table/preview';
import { sectionSegments } from '~/geometry/section';
import { edgesOf, edgesSeenFrom } from './drawn-edges';
import { fatLines } from './fat-lines';
import { useInk, type Ink } from './ink';
import { depthOnly, fill, hatch, surfaceTone } from './materials';
import type { Plate, Projection } from './projection';
import { withoutLid } from './without-lid';
import { levelPlane, worldOf, worldPoints, type ToWorld } from './world';

export interface TankCanvasProps {
  preview: Preview;
  plate: Plate;
  projection: Projection;
  /** Levels (u·p) of the regions, mm; null where a region does not exist. */
  levels: {
    wet: number | null;
    unusable: number | null;
    safeFill: number | null;
  };
  /** Id of the solid whose lines stand out. */
  selected: string | null;
}

/**
 * The tank as a drawing in WebGL: see-through shell with visible and hidden edges, liquid cut at
 * the level by a true plane, regions told apart by pattern. Rendered only when something changed.
 */
export default function TankCanvas(props: TankCanvasProps) {
  return (
    <Canvas
      orthographic
      flat
      frameloop="demand"
      dpr={[1, 2]}
      camera={{ position: [0, 0, 10], near: 0.1, far: 20, zoom: 1 }}
      gl={{ antialias: true, alpha: true }}
      onCreated={({ gl }) => {
        gl.localClippingEnabled = true;
      }}
      aria-hidden="true"
    >
      <Drawing {...props} />
    </Canvas>
  );
}

function Drawing({ preview, plate, projection, levels, selected }: TankCanvasProps) {
  const ink = useInk();
  const pixelRatio = useThree((state) => state.viewport.dpr);
  const toWorld = useMemo(() => worldOf(projection, plate), [projection, plate]);
  const space = useGeometry(preview.space, toWorld);
  const walls = useMemo(() => withoutLid(preview.space, preview.frame.up), [preview]);
  const sides = useGeometry(walls, toWorld);
  const edges = useMemo(() => edgesOf(preview.space), [preview.space]);
  const resolution = useMemo(
    () => new Vector2(plate.width, plate.height),
    [plate.width, plate.height],
  );
  const outline = useMemo(
    () => worldPoints(edgesSeenFrom(edges, projection.towards), toWorld),
    [edges, projection.towards, toWorld],
  );
  const displaced = useMemo(
    () => preview.solids.filter((solid) => solid.role === 'displaces'),
    [preview.solids],
  );
  const chosen = useMemo(() => {
    const solid = preview.solids.find((one) => one.id === selected);
    return solid
      ? worldPoints(edgesSeenFrom(edgesOf(solid), projection.towards), toWorld)
      : new Float32Array();
  }, [preview.solids, selected, projection.towards, toWorld]);
  const wet = useMemo(
    () =>
      levels.wet === null
        ? new Float32Array()
        : worldPoints(sectionSegments(preview.space, preview.frame.up, levels.wet), toWorld),
    [preview, levels.wet, toWorld],
  );
  const planes = useMemo(() => {
    const plane = (level: number | null, keep: 'below' | 'above') =>
      level === null ? null : levelPlane(preview.frame.up, level, keep, toWorld);
    return {
      wet: plane(levels.wet, 'below'),
      unusable: plane(levels.unusable, 'below'),
      headroom: plane(levels.safeFill, 'above'),
    };
  }, [preview.frame.up, levels.wet, levels.unusable, levels.safeFill, toWorld]);

  return (
    <>
      <Faces
        geometry={space}
        order={1}
        material={() => fill(ink.sheet, DoubleSide, [], false)}
        deps={[ink]}
      />
      {planes.wet && (
        <>
          <Faces
            geometry={space}
            order={2}
            material={() => fill(ink.wash, FrontSide, [planes.wet!], true)}
            deps={[ink, planes.wet]}
          />
          <Faces
            geometry={space}
            order={2}
            material={() => fill(surfaceTone(ink), BackSide, [planes.wet!], true)}
            deps={[ink, planes.wet]}
          />
        </>
      )}
      {planes.unusable && (
        <Faces
          geometry={space}
          order={4}
          material={() => hatch('unusable', ink.ink2, [planes.unusable!], pixelRatio)}
          deps={[ink, planes.unusable, pixelRatio]}
        />
      )}
      {planes.headroom && (
        <Faces
          geometry={sides}
          order={4}
          material={() => hatch('headroom', ink.ink2, [planes.headroom!], pixelRatio)}
          deps={[ink, planes.headroom, pixelRatio]}
        />
      )}
      {displaced.map((solid) => (
        <Solid key={solid.id} mesh={solid} toWorld={toWorld} ink={ink} pixelRatio={pixelRatio} />
      ))}
      <Faces geometry={space} order={6} material={depthOnly} deps={[]} />
      <Lines
        segments={outline}
        colour={ink.line}
        widthPx={1}
        where="hidden"
        order={7}
        resolution={resolution}
      />
      <Lines
        segments={outline}
        colour={ink.ink}
        widthPx={1.6}
        where="visible"
        order={8}
        resolution={resolution}
      />
      <Lines
        segments={chosen}
        colour={ink.ink2}
        widthPx={1.1}
        where="always"
        order={7}
        resolution={resolution}
      />
      <Lines
        segments={wet}
        colour={ink.datum}
        widthPx={1.4}
        where="always"
        order={10}
        resolution={resolution}
      />
    </>
  );
}

function Solid(props: { mesh: TankMesh; toWorld: ToWorld; ink: Ink; pixelRatio: number }) {
  const geometry = useGeometry(props.mesh, props.toWorld);
  return (
    <Faces
      geometry={geometry}
      order={5}
      material={() => hatch('deadwood', props.ink.line, [], props.pixelRatio)}
      deps={[props.ink, props.pixelRatio]}
    />
  );
}

function Faces(props: {
  geometry: BufferGeometry;
  order: number;
  material(): Material;
  deps: readonly unknown[];
}) {
  const { geometry, order, material, deps } = props;
  const mesh = useMemo(
    () => {
      const made = new Mesh(geometry, material());
      made.renderOrder = order;
      made.frustumCulled = false;
      return made;
    },
    // the maker is a new function each time; what it closes over is named by deps
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [geometry, order, ...deps],
  );
  useEffect(() => () => mesh.material.dispose(), [mesh]);
  return <Shown object={mesh} />;
}

function Lines(props: {
  segments: Float32Array;
  colour: string;
  widthPx: number;
  where: 'visible' | 'hidden' | 'always';
  order: number;
  resolution: Vector2;
}) {
  const { segments, colour, widthPx, where, order, resolution } = props;
  const lines = useMemo(
    () =>
      segments.length === 0
        ? null
        : fatLines(segments, { colour, widthPx, where, order }, resolution),
    [segments, colour, widthPx, where, order, resolution],
  );
  useEffect(
    () => () => {
      lines?.geometry.dispose();
      lines?.material.dispose();
    },
    [lines],
  );
  return lines && <Shown object={lines} />;
}

function Shown({ object }: { object: Object3D }) {
  return <primitive object={object} dispose={null} />;
}

function useGeometry(mesh: TankMesh, toWorld: ToWorld): BufferGeometry {
  const geometry = useMemo(() => {
    const made = new BufferGeometry();
    made.setAttribute('position', new BufferAttribute(worldPoints(mesh.positions, toWorld), 3));
    made.setIndex(new BufferAttribute(mesh.triangles, 1));
    return made;
  }, [mesh, toWorld]);
  useEffect(() => () => geometry.dispose(), [geometry]);
  return geometry;
}
