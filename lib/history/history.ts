export interface History { readonly todo?: never }
