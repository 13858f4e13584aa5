/**
 * Names that ORCA's simple input takes for functionals, basis sets, dispersion and solvation. The output repeats
 * a functional only in the echoed keyword line, and old versions the basis too. Names are keywords of the
 * program's input (ORCA manuals 2.9 to 6.1), compared without case.
 */
const functionals = new Set(
  (
    'HFS LSD LDA VWN VWN5 VWN3 PWLDA BP BP86 BLYP OLYP GLYP XLYP PW91 MPWPW MPWLYP PBE RPBE REVPBE RPW86PBE PWP ' +
    'B97-D B97-D3 B97-D4 B97M-V B97M-D3BJ B97M-D4 TPSS REVTPSS M06L M06-L SCAN SCANFUNC RSCAN R2SCAN R2SCAN-3C ' +
    'B97-3C PBEH-3C WB97X-3C B3LYP-3C B1LYP B1P G1LYP G1P B3LYP B3LYP/G B3LYP_G B3LYP_TM B3P B3P86 B3PW B3PW91 ' +
    'O3LYP X3LYP PW1PW PBE0 PBE1PBE MPW1PW MPW1LYP PW6B95 REVPBE0 REVPBE38 BHANDHLYP BHLYP M06 M06-2X M062X ' +
    'TPSSH TPSS0 R2SCANH R2SCAN0 R2SCAN50 CAM-B3LYP LC-BLYP LC-PBE HSE06 WB97 WB97X WB97X-D3 WB97X-V WB97X-D3BJ ' +
    'WB97X-D4 WB97X-D4REV WB97M-V WB97M-D3BJ WB97M-D4 WB97M-D4REV WR2SCAN B2PLYP MPW2PLYP B2GP-PLYP B2K-PLYP ' +
    'B2T-PLYP B2NC-PLYP PWPB95 PBE0-DH PBE-QIDH PBE0-2 DSD-BLYP DSD-PBEP86 DSD-PBEB95 REVDSD-PBEP86/2021 ' +
    'REVDSD-PBEP86-D4/2021 REVDOD-PBEP86/2021 PR2SCAN50 PR2SCAN69 KPR2SCAN50 WB2PLYP WB2GP-PLYP RSX-QIDH RSX-0DH ' +
    'WB88PP86 WPBEPP86 SCS/SOS-WB2PLYP'
  ).split(' '),
);

export function isFunctional(keyword: string): boolean {
  const name = keyword.toUpperCase();
  return functionals.has(name) || functionals.has(name.replace(/^(?:RI-|DLPNO-|UKS-|RKS-)/, ''));
}

/** Orbital basis sets; those for fitting end in /J, /C, /JK, or are named AutoAux or CABS. */
export function isBasis(keyword: string): boolean {
  return (
    !/\/(?:J|C|JK|CABS)$|^autoaux$|cabs/i.test(keyword) &&
    (/^(?:ma-|zora-|dkh-|x2c-|old-)?def2?-/i.test(keyword) ||
      /^(?:aug-|jul-|heavy-aug-|haug-)?(?:cc-p|pc-|pcseg-|pcsseg-|pcj-|pch-)/i.test(keyword) ||
      /^(?:sarc2?|epr|iglo|lanl|sto|ano|saug-ano|aug-ano|wachters|partridge|sapporo|bnano|nasa)-?[a-z0-9+()-]*$/i.test(
        keyword,
      ) ||
      /^(?:3-21|6-31|6-311|m6-31|4-22)[a-z0-9+*(),]*$/i.test(keyword) ||
      /^(?:zora-|dkh-)?(?:sv|svp|sv\(p\)|vdz|vtz|tzv|tzvp|tzvpp|qzvp|qzvpp|dz|midi|mini[sx]?)$/i.test(
        keyword,
      ))
  );
}

export function isDispersion(keyword: string): boolean {
  return /^(?:d2|d3|d3zero|d3\(0\)|d3bj|d3\(bj\)|d3tz|d4|vdw|vdw06|vdw10|vdw10bj|nl|scnl)$/i.test(keyword);
}

/** CPCM(water), SMD(CH2Cl2), COSMO(...), ALPB(...), ddCOSMO(...), CPCMX(...). */
export function isSolvation(keyword: string): boolean {
  return /^(?:c-?pcm|cpcmc|smd|cosmo|alpb|ddcosmo|cpcmx|cosmors)(?:\([^)]{1,40}\))?$/i.test(keyword);
}

export function isRelativity(keyword: string): boolean {
  return /^(?:zora|zora\/ri|iora|iora\/ri|dkh|dkh1|dkh2|x2c|dlu-x2c)$/i.test(keyword);
}
