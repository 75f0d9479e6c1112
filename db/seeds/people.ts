/** The invented people of the Tarn Hollow Accretion Group, and how to sign in as them. */
export const demoSignIns = [
  {
    name: "Ilse Wray",
    email: "ilse.wray@tarn-hollow.example",
    password: "limiting luminosity",
  },
  {
    name: "Tomasz Oduya",
    email: "tomasz.oduya@tarn-hollow.example",
    password: "tidal disruption",
  },
  {
    name: "Maren Lindqvist-Sarr",
    email: "maren.lindqvist-sarr@tarn-hollow.example",
    password: "cooling break",
  },
] as const;

export type DemoEmail = (typeof demoSignIns)[number]["email"];
