/** Made by expertise.plugin.ts. */
declare module "virtual:expertise-address" {
  export const expertiseAddress: string;
}
