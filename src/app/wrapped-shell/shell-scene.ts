/** The wrapped shell on its ground in daylight. Draws a frame only when something changed. */
import {
  CanvasTexture,
  Color,
  DirectionalLight,
  Group,
  HemisphereLight,
  Mesh,
  MeshStandardMaterial,
  VSMShadowMap,
  PerspectiveCamera,
  PlaneGeometry,
  RepeatWrapping,
  Scene,
  ShadowMaterial,
  SRGBColorSpace,
  WebGLRenderer,
} from 'three';
import { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';
import { ringFaces } from './ring-geometry';
import { ShellTexture, type TextureLayout } from './shell-texture';

/** Field of view, upright, in degrees: long enough that a shell does not bulge. */
const VIEW_ANGLE = 26;
/** The picture for the client is this many pixels wide. */
const PICTURE_WIDTH = 2000;
const PICTURE_HEIGHT = 1600;
const TURN_STEP = Math.PI / 24;

/** Sharp enough at the shell's edges; more costs frames on small chips. three lowers it to what the chip can do. */
const ANISOTROPY_MOST = 8;

/** Without a graphics chip the browser draws in software: right, but slow, so it is asked for less. */
function drawnBy(renderer: WebGLRenderer): 'graphics chip' | 'software' {
  const context = renderer.getContext();
  const info = context.getExtension('WEBGL_debug_renderer_info');
  const name: unknown = info ? context.getParameter(info.UNMASKED_RENDERER_WEBGL) : '';
  return /swiftshader|llvmpipe|software/i.test(String(name)) ? 'software' : 'graphics chip';
}

/** How much further off a window of this shape looks from: an upright one is narrower than it is tall. */
function roomFor(aspect: number): number {
  return Math.max(1, 1.12 / aspect);
}

export class ShellScene {
  private readonly renderer: WebGLRenderer;
  private readonly drawnBy: 'graphics chip' | 'software';
  private readonly scene = new Scene();
  private readonly camera = new PerspectiveCamera(VIEW_ANGLE, 1, 1, 100_000);
  private readonly controls: OrbitControls;
  private readonly sun = new DirectionalLight(0xfff4e2, 2.7);
  private ring = new Group();
  private parts: readonly { dispose: () => void }[] = [];
  private texture: { readonly painted: ShellTexture; readonly map: CanvasTexture } | null = null;
  private awaited = 0;

  /** Throws where the browser has no WebGL. */
  constructor(
    private readonly canvas: HTMLCanvasElement,
    private readonly window: Window,
    /** Called when the camera was moved by pointer or touch. */
    private readonly onTurned: () => void,
  ) {
    this.renderer = new WebGLRenderer({ canvas, antialias: true, alpha: true });
    this.renderer.shadowMap.enabled = true;
    this.renderer.shadowMap.type = VSMShadowMap;
    // neither the ring nor the sun moves: the shadow is worked out once a shell
    this.renderer.shadowMap.autoUpdate = false;
    this.drawnBy = drawnBy(this.renderer);
    this.renderer.setPixelRatio(
      this.drawnBy === 'software' ? 1 : Math.min(window.devicePixelRatio, 2),
    );
    this.controls = new OrbitControls(this.camera, canvas);
    this.controls.enablePan = false;
    this.controls.enableDamping = false;
    this.controls.minPolarAngle = 0.25;
    this.controls.maxPolarAngle = Math.PI / 2 - 0.04;
    this.controls.addEventListener('change', () => {
      this.draw();
      this.onTurned();
    });
    this.light();
  }

  /** Another shell, joint or set of woods: everything is built again; the view stays where it is. */
  show(layout: TextureLayout, cells: Uint8Array): void {
    const view = this.texture === null ? 'new' : 'kept';
    this.clearRing();
    const painted = new ShellTexture(layout, this.canvas.ownerDocument);
    painted.paintAll(cells);
    const map = new CanvasTexture(painted.canvas);
    map.wrapS = RepeatWrapping;
    map.colorSpace = SRGBColorSpace;
    map.anisotropy = this.drawnBy === 'software' ? 1 : ANISOTROPY_MOST;
    this.texture = { painted, map };
    const wood = new MeshStandardMaterial({ map, roughness: 0.62, metalness: 0 });
    const bored = new MeshStandardMaterial({ map, roughness: 0.85, color: new Color(0xb9aa98) });
    const faces = ringFaces(layout.shell);
    this.parts = [...faces, wood, bored, map];
    faces.forEach((face, i) => {
      const mesh = new Mesh(face, i === 2 ? bored : wood);
      mesh.castShadow = true;
      mesh.receiveShadow = true;
      this.ring.add(mesh);
    });
    this.scene.add(this.ring);
    this.frameShell(layout, view);
    this.renderer.shadowMap.needsUpdate = true;
    this.draw();
  }

  /** Tiles laid since the last picture. */
  follow(cells: Uint8Array, positions: Iterable<number>): void {
    if (!this.texture) return;
    this.texture.painted.paintTiles(cells, positions);
    this.texture.map.needsUpdate = true;
    this.draw();
  }

  /** Turns the shell by steps round its axis and tips the view by steps. */
  turn(steps: number, tips: number): void {
    const { camera, controls } = this;
    const offset = camera.position.clone().sub(controls.target);
    const around = Math.atan2(offset.x, offset.z) - steps * TURN_STEP;
    const distance = offset.length();
    const low = controls.minPolarAngle;
    const high = controls.maxPolarAngle;
    const polar = Math.acos(offset.y / distance) - tips * TURN_STEP;
    const tipped = Math.min(Math.max(polar, low), high);
    offset.setFromSphericalCoords(distance, tipped, around);
    camera.position.copy(controls.target).add(offset);
    controls.update();
    this.draw();
  }

  /** How far the shell is turned, as the stave (0…) that faces the viewer. */
  facingStave(staves: number): number {
    const offset = this.camera.position.clone().sub(this.controls.target);
    const turn = Math.atan2(offset.x, offset.z) / (2 * Math.PI);
    return Math.floor((((turn % 1) + 1) % 1) * staves);
  }

  /** Fits the drawing to its place on the page, in CSS pixels. */
  resize(width: number, height: number): void {
    if (width === 0 || height === 0) return;
    this.renderer.setSize(width, height, false);
    this.shape(width / height);
    this.draw();
  }

  /** The present view as a PNG, 2000 pixels wide, on paper. */
  async picture(paper: string): Promise<Blob> {
    const size = { width: this.canvas.clientWidth, height: this.canvas.clientHeight };
    const ratio = this.renderer.getPixelRatio();
    this.renderer.setPixelRatio(1);
    this.renderer.setSize(PICTURE_WIDTH, PICTURE_HEIGHT, false);
    this.shape(PICTURE_WIDTH / PICTURE_HEIGHT);
    this.scene.background = new Color(paper);
    this.renderer.render(this.scene, this.camera);
    const taken = new Promise<Blob>((resolve, reject) => {
      this.canvas.toBlob((blob) => {
        if (blob) resolve(blob);
        else reject(new Error('The browser made no picture.'));
      }, 'image/png');
    });
    this.scene.background = null;
    this.renderer.setPixelRatio(ratio);
    this.resize(size.width, size.height);
    return taken;
  }

  /** Frees what the graphics chip holds. */
  dispose(): void {
    this.window.cancelAnimationFrame(this.awaited);
    this.clearRing();
    this.controls.dispose();
    this.renderer.dispose();
  }

  /** Another shape of the window: upright ones look from further away, so that the shell's sides stay in. */
  private shape(aspect: number): void {
    const { camera, controls } = this;
    const further = roomFor(aspect) / roomFor(camera.aspect);
    camera.position.sub(controls.target).multiplyScalar(further).add(controls.target);
    controls.minDistance *= further;
    controls.maxDistance *= further;
    camera.aspect = aspect;
    camera.updateProjectionMatrix();
  }

  private draw(): void {
    if (this.awaited !== 0) return;
    this.awaited = this.window.requestAnimationFrame(() => {
      this.awaited = 0;
      this.renderer.render(this.scene, this.camera);
    });
  }

  private light(): void {
    this.scene.add(new HemisphereLight(0xf4f7ff, 0xb7a58c, 1.9));
    this.sun.castShadow = true;
    this.sun.shadow.mapSize.set(2048, 2048);
    this.sun.shadow.radius = 9;
    this.sun.shadow.blurSamples = 20;
    this.scene.add(this.sun, this.sun.target);
    const ground = new Mesh(new PlaneGeometry(1, 1), new ShadowMaterial({ opacity: 0.22 }));
    ground.rotation.x = -Math.PI / 2;
    ground.receiveShadow = true;
    ground.scale.setScalar(100_000);
    this.scene.add(ground);
  }

  private frameShell({ shell }: TextureLayout, view: 'new' | 'kept'): void {
    const radius = shell.finishedOuterDiameter / 2;
    const height = shell.finishedHeight;
    const size = Math.hypot(2 * radius, height);
    this.controls.target.set(0, height / 2, 0);
    const distance =
      (roomFor(this.camera.aspect) * size) / (1.85 * Math.tan((VIEW_ANGLE * Math.PI) / 360));
    this.controls.minDistance = distance * 0.45;
    this.controls.maxDistance = distance * 2;
    if (view === 'new') this.camera.position.set(0, height / 2 + distance * 0.3, distance * 0.95);
    this.camera.near = distance / 50;
    this.camera.far = distance * 6;
    this.camera.updateProjectionMatrix();
    this.sun.position.set(-size * 0.9, size * 2.4, size * 1.3);
    this.sun.target.position.set(0, height / 2, 0);
    const { camera } = this.sun.shadow;
    Object.assign(camera, { left: -size, right: size, top: size, bottom: -size });
    Object.assign(camera, { near: size * 0.1, far: size * 6 });
    camera.updateProjectionMatrix();
    this.sun.shadow.bias = -0.0004;
    this.sun.shadow.normalBias = size / 2000;
    this.controls.update();
  }

  private clearRing(): void {
    for (const part of this.parts) part.dispose();
    this.parts = [];
    this.scene.remove(this.ring);
    this.ring = new Group();
  }
}
