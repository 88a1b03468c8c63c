/** Who we are on the platform. */
export interface Me {
  readonly id: number;
  readonly username: string;
}
