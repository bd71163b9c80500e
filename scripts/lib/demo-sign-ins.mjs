/** The demo: one person for each role of one shop, and a second shop that none of them can see. All invented. */
export const demoShop = 'Juniper Field Engine Shop'
export const secondShop = 'Saltmarsh Aero Works'
export const demoPassword = 'workshop-juniper'

/**
 * @typedef {'builder' | 'designer' | 'technician' | 'inspector' | 'instructor' | 'owner'} DemoRole
 * @typedef {{ shop: string, role: DemoRole, name: string, email: string, password: string }} DemoSignIn
 */

/** @type {readonly DemoSignIn[]} */
export const demoSignIns = [
  { shop: demoShop, role: 'designer', name: 'Noor Adeyemi', email: 'noor@juniper.example', password: demoPassword },
  { shop: demoShop, role: 'builder', name: 'Ines Okafor', email: 'ines@juniper.example', password: demoPassword },
  { shop: demoShop, role: 'technician', name: 'Ola Brandt', email: 'ola@juniper.example', password: demoPassword },
  { shop: demoShop, role: 'inspector', name: 'Petra Lindqvist', email: 'petra@juniper.example', password: demoPassword },
  { shop: demoShop, role: 'instructor', name: 'Tomasz Bielak', email: 'tomasz@juniper.example', password: demoPassword },
  { shop: demoShop, role: 'owner', name: 'Mara Quist', email: 'mara@juniper.example', password: demoPassword },
  { shop: secondShop, role: 'owner', name: 'Ben Achebe', email: 'ben@saltmarsh.example', password: demoPassword },
]

/** The sign-ins as lines for a terminal, grouped by shop. */
export function demoLines() {
  const widest = Math.max(...demoSignIns.map(({ email }) => email.length))
  return [demoShop, secondShop].flatMap((shop) => [
    `  ${shop}`,
    ...demoSignIns.filter((each) => each.shop === shop).map(({ email, role, name }) => `    ${email.padEnd(widest)}  ${role}, ${name}`),
  ]).concat(`  Password of all: ${demoPassword}`)
}
