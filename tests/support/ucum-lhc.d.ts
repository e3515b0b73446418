/** The library has no types of its own; as much of it as the referee asks. */
declare module '@lhncbc/ucum-lhc' {
  export const UcumLhcUtils: {
    getInstance: () => {
      convertUnitTo: (
        from: string,
        value: number,
        to: string,
      ) => { status: 'succeeded' | 'failed' | 'error'; toVal: number | null; msg: readonly string[] };
    };
  };
}
