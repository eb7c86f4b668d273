// The part of clipper-lib that the checks use; the package brings no types.
declare module 'clipper-lib' {
  interface IntPoint {
    X: number;
    Y: number;
  }
  type Path = IntPoint[];
  interface Offset {
    AddPath(path: Path, join: number, end: number): void;
    Execute(solution: Path[], delta: number): void;
  }
  const ClipperLib: {
    ClipperOffset: new (miterLimit: number, arcTolerance: number) => Offset;
    JoinType: { jtMiter: number };
    EndType: { etClosedPolygon: number };
    Paths: new () => Path[];
  };
  export default ClipperLib;
}
