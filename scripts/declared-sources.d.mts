export interface DeclaredSource {
  readonly id: string;
  readonly role: "method" | "model" | "entity";
  readonly revision: number;
  /** File, relative to the package folder. */
  readonly where: string;
  readonly hash: string;
  /** Ids of the other declarations that it reaches, not through one of them. */
  readonly reaches: readonly string[];
}
export function declaredSources(folder: string): DeclaredSource[];
