import { Canvas, useFrame, useThree } from '@react-three/fiber';
import { lazy, Suspense, useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { OrthographicCamera } from 'three';
import { offerStill, type Taker } from '../export/still';
import type { DrawnPicture } from '../drawn-picture';
import { useDrawn } from '../hooks/use-drawn';
import type { RoomPicture } from '../picture';
import { BodyFigures } from './body-figures';
import { CutCaps } from './cut-caps';
import { followView } from './follow-view';
import { Ground } from './ground';
import { PieceSolids } from './piece-solids';
import { readPalette, readPaperPalette } from './palette';
import { createMaterials, createSharedUniforms, type SharedUniforms } from './shaders';
import type { ViewController } from './view-controller';
import { add, scale, turn } from './vectors';
import { projectionColumns, type ViewFrame } from './view-frame';
import type { Cut, SceneView } from './views';

const GhostFigures = lazy(() => import('../bodies/ghost-figures'));

const METRES = 0.001;

interface SceneProps {
  picture: RoomPicture;
  /** What is in the hand is drawn as the hand has it, frame by frame. */
  following?: boolean;
  controller: ViewController;
  letter: SceneView;
  cut: Cut | undefined;
  chosenIds: readonly string[];
  showBodies: boolean;
  /** Draws round the bodies how small and how large they may be. */
  showDoubt?: boolean;
  /** Raised when the theme changes. */
  theme: string;
  /** Receives the figures of the last picture, for tests and for the curious. */
  report: (figures: { calls: number; triangles: number; geometries: number }) => void;
  /** Who may copy the picture; the answer takes the offer back. Usually whoever saves what stands on the screen. */
  offer?: (taker: Taker) => () => void;
  /** For paper: the colours of the light theme. */
  forPaper?: boolean;
  /** Pixels of the picture for one of the page; as the screen has it when absent. */
  pixelRatio?: number;
}

const inMetres = (frame: ViewFrame): ViewFrame => ({
  ...frame,
  perspective: frame.perspective / METRES,
  eyeMm: [frame.eyeMm[0] * METRES, frame.eyeMm[1] * METRES],
  centreMm: [frame.centreMm[0] * METRES, frame.centreMm[1] * METRES],
  halfHeightMm: frame.halfHeightMm * METRES,
  depthMm: [frame.depthMm[0] * METRES, frame.depthMm[1] * METRES],
});

/** Where the eye stands in the room, for what is drawn by how it is seen. */
function placeEye(shared: SharedUniforms, frame: ViewFrame) {
  const toward = turn(frame.orientation, [0, 0, 1]);
  if (frame.perspective < 1e-9) {
    shared.uEye.value.set(...toward, 0);
    return;
  }
  const right = scale(turn(frame.orientation, [1, 0, 0]), frame.eyeMm[0]);
  const up = scale(turn(frame.orientation, [0, 1, 0]), frame.eyeMm[1]);
  shared.uEye.value.set(...add(frame.target, add(add(right, up), scale(toward, 1 / frame.perspective))), 1);
}

function aim(camera: OrthographicCamera, frame: ViewFrame, aspect: number) {
  camera.position.set(frame.target[0] * METRES, frame.target[1] * METRES, frame.target[2] * METRES);
  camera.quaternion.set(...frame.orientation);
  camera.updateMatrixWorld();
  camera.projectionMatrix.fromArray(projectionColumns(inMetres(frame), aspect));
  camera.projectionMatrixInverse.copy(camera.projectionMatrix).invert();
}

/** Follows the hand in here alone: nothing of the page round the drawing is made anew for a frame. */
function FollowingStage(props: SceneProps) {
  return <Stage {...props} drawn={useDrawn(props.picture)} />;
}

function Stage({
  picture,
  drawn,
  controller,
  letter,
  cut,
  chosenIds,
  showBodies,
  showDoubt = false,
  theme,
  report,
  offer = offerStill,
  forPaper = false,
}: SceneProps & { drawn: DrawnPicture }) {
  // Doubt is drawn round those who stand where they were counted.
  const standing = drawn.bodies.filter(({ pieceId }) => !drawn.carried?.before.has(pieceId));
  const camera = useMemo(() => new OrthographicCamera(), []);
  const shared = useMemo(() => createSharedUniforms(), []);
  const materials = useMemo(() => createMaterials(shared), [shared]);
  const { advance, invalidate, get, gl } = useThree();
  const canvas = gl.domElement;
  // The theme is read from the tokens, which React does not see change.
  const palette = useMemo(
    () => ({ ...(forPaper ? readPaperPalette(canvas) : readPalette(canvas)), theme }),
    [canvas, forPaper, theme],
  );

  useEffect(() => {
    palette.tones.forEach((tone, n) => shared.uTones.value[n]?.copy(tone));
    shared.uPen.value.copy(palette.pen);
    shared.uShade.value.copy(palette.shade);
    materials.inks.chosen.copy(palette.chosen);
    materials.inks.floor.copy(palette.floor);
    materials.inks.wall.copy(palette.wall);
    invalidate();
  }, [palette, shared, materials, invalidate]);

  useEffect(() => {
    if (cut) {
      const distance =
        cut.toward[0] * cut.pointMm[0] + cut.toward[1] * cut.pointMm[1] + cut.toward[2] * cut.pointMm[2];
      shared.uCut.value.set(...cut.toward, distance);
    } else shared.uCut.value.set(0, 0, 0, 1);
    invalidate();
  }, [cut, shared, invalidate]);

  useLayoutEffect(() => followView(controller, get), [controller, get]);
  useEffect(
    () =>
      offer(() => {
        advance(performance.now());
        return canvas;
      }),
    [advance, canvas, offer],
  );
  useEffect(() => invalidate(), [drawn, letter, chosenIds, showBodies, showDoubt, invalidate]);
  useEffect(
    () => () => Object.values(materials).forEach((item) => 'dispose' in item && item.dispose()),
    [materials],
  );

  const lastReport = useRef('');
  useFrame(({ gl: renderer, scene, size }) => {
    const frame = controller.frame();
    if (!frame) return;
    placeEye(shared, frame);
    shared.uSize.value.set(size.width, size.height);
    aim(camera, frame, size.width / Math.max(1, size.height));
    renderer.render(scene, camera);
    const { calls, triangles } = renderer.info.render;
    const { geometries } = renderer.info.memory;
    const figures = `${calls} ${triangles} ${geometries}`;
    if (figures !== lastReport.current) {
      lastReport.current = figures;
      report({ calls, triangles, geometries });
    }
  }, 1);

  return (
    <group scale={METRES}>
      <Ground picture={picture} letter={letter} materials={materials} />
      <PieceSolids
        picture={drawn}
        letter={letter}
        chosenIds={chosenIds}
        showBodies={showBodies}
        materials={materials}
      />
      {cut && <CutCaps picture={drawn} letter={letter} cut={cut} materials={materials} />}
      {showBodies && <BodyFigures picture={drawn} palette={palette} shared={shared} materials={materials} />}
      {showBodies && showDoubt && (
        <Suspense fallback={null}>
          <GhostFigures bodies={standing} palette={palette} shared={shared} />
        </Suspense>
      )}
    </group>
  );
}

/** The drawing itself. It holds no state and takes no input: those live around it. */
export default function SceneCanvas(props: SceneProps) {
  return (
    <Canvas
      frameloop="demand"
      dpr={props.pixelRatio ?? [1, 2]}
      gl={{ antialias: true, alpha: true, stencil: true }}
      resize={{ scroll: false, debounce: 0 }}
      style={{ position: 'absolute', inset: 0, pointerEvents: 'none' }}
      aria-hidden="true"
      tabIndex={-1}
    >
      {props.following ? <FollowingStage {...props} /> : <Stage {...props} drawn={props.picture} />}
    </Canvas>
  );
}
