/** A place in an application's navigation. */
export interface NavLink {
  readonly label: string;
  readonly path: string;
  /** Whether only this very address counts as being there, not what lies under it. */
  readonly exact?: boolean;
}
