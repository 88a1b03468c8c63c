// mathjs's own single file has no types of its own; it is the same library.
declare module 'mathjs/lib/browser/math.js' {
  import type * as mathjs from 'mathjs';
  const math: typeof mathjs;
  export default math;
}
