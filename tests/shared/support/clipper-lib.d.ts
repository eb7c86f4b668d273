// The part of clipper-lib that the checks use; the package brings no types.
declare module 'clipper-lib' {
  interface IntPoint {
    X: number;
    Y: number;
  }
  type Path = IntPoint[];
  class ClipperOffset {
    constructor(miterLimit: number, arcTolerance: number);
    AddPath(path: Path, join: number, end: number): void;
    Execute(solution: Path[], delta: number): void;
  }
  const ClipperLib: {
    ClipperOffset: typeof ClipperOffset;
    JoinType: { jtMiter: number };
    EndType: { etClosedPolygon: number };
    Paths: new () => Path[];
  };
  export default ClipperLib;
}
