/** Object identifiers of what seals are made of, each with where it is defined. */
export const OID = {
  // RFC 5652
  data: '1.2.840.113549.1.7.1',
  signedData: '1.2.840.113549.1.7.2',
  contentType: '1.2.840.113549.1.9.3',
  messageDigest: '1.2.840.113549.1.9.4',
  // RFC 5035
  signingCertificate: '1.2.840.113549.1.9.16.2.47',
  // RFC 3161
  timeStampInfo: '1.2.840.113549.1.9.16.1.4',
  timeStampToken: '1.2.840.113549.1.9.16.2.14',
  timeStamping: '1.3.6.1.5.5.7.3.8',
  // RFC 5754
  sha256: '2.16.840.1.101.3.4.2.1',
  sha384: '2.16.840.1.101.3.4.2.2',
  sha512: '2.16.840.1.101.3.4.2.3',
  // RFC 5758
  ecdsaSha256: '1.2.840.10045.4.3.2',
  ecdsaSha384: '1.2.840.10045.4.3.3',
  ecdsaSha512: '1.2.840.10045.4.3.4',
  // RFC 5480
  ecKey: '1.2.840.10045.2.1',
  p256: '1.2.840.10045.3.1.7',
  p384: '1.3.132.0.34',
  // RFC 8017
  rsaKey: '1.2.840.113549.1.1.1',
  rsaSha256: '1.2.840.113549.1.1.11',
  rsaSha384: '1.2.840.113549.1.1.12',
  rsaSha512: '1.2.840.113549.1.1.13',
  // RFC 5280
  keyUsage: '2.5.29.15',
  basicConstraints: '2.5.29.19',
  extendedKeyUsage: '2.5.29.37',
  anyUsage: '2.5.29.37.0',
  emailProtection: '1.3.6.1.5.5.7.3.4',
  // RFC 9336
  documentSigning: '1.3.6.1.5.5.7.3.36',
} as const
