/**
 * Function names of the expression library that formulas may not call. They are never present in the
 * evaluator; the list only serves to say *forbidden* rather than *unknown* when one is written.
 */
export const refusedFunctions: ReadonlySet<string> = new Set(
  `acot acoth acsc acsch add apply arg asec asech bellNumbers bernoulli bigint bignumber bin bitAnd
  bitNot bitOr bitXor boolean catalan chain clone column combinationsWithRep compare compareNatural
  compareText compile complex composition concat config conj corr cot coth count create createUnit
  cross csc csch ctranspose cube cumsum deepEqual derivative det diag diff distance divide dot
  dotDivide dotMultiply dotPow eigs emit equal equalText eval evaluate expm factory fft filter fix
  flatten forEach format fraction freqz Function gcd hasNumericValue help hex identity ifft im import
  index intersect inv invmod isInteger isNaN isNegative isNumeric isPositive isPrime isZero
  kldivergence kron larger largerEq lcm leafCount leftShift lsolve lsolveAll lup lusolve lyap mad map
  matrix matrixFromColumns matrixFromFunction matrixFromRows mean median mod mode multinomial multiply
  norm number numeric oct off on once ones or parse parser partitionSelect permutations pickRandom
  pinv polynomialRoot pow print prod qr quantileSeq random randomInt range rationalize re replacer
  require reshape resize resolve reviver rightArithShift rightLogShift rotate rotationMatrix row schur
  sec sech setCartesian setDifference setDistinct setIntersect setIsSubset setMultiplicity setPowerset
  setSize setSymDifference setUnion simplify simplifyConstant simplifyCore size slu smaller smallerEq
  sort sparse splitUnit sqrtm square squeeze std stirlingS2 string subset subtract sylvester
  symbolicEqual toBest trace transpose typed typeOf unaryMinus unaryPlus unequal unit usolve usolveAll
  variance xgcd xor zeros zeta zpk2tf`.split(/\s+/),
);
