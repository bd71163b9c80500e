/** Version of the calculation library, stored beside every saved result. Any change of a figure changes it. */
export const calcVersion = '1.1.0'
