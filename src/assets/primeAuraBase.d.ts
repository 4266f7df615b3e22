/** The package ships types for every component's tokens and for the whole, not for the shared base. */
declare module '@primevue/themes/aura/base' {
  const base: { primitive: object; semantic: object }
  export default base
}
