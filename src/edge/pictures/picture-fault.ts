/** A picture that the machine could not draw. */
export class PictureFault extends Error {
  override readonly name = 'PictureFault';

  constructor(reason: 'time' | 'failed', options?: ErrorOptions) {
    super(`Cannot draw the picture: ${reason}`, options);
  }
}
