/** The one function of jstat that this project uses; the package ships no types. */
declare module 'jstat' {
  const package_: {
    readonly jStat: { gammaln(x: number): number };
  };
  export default package_;
}
