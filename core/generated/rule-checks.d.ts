export declare const c0: (values: object) => boolean
export declare const c1: (values: object) => boolean
