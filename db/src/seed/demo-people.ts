/** Companies and people of the demo. All invented; the addresses are of `example` domains. */

export interface DemoPerson {
  name: string;
  email: string;
  role: "trainee" | "technician" | "senior" | "supervisor";
}

export interface DemoCompany {
  slug: string;
  name: string;
  people: DemoPerson[];
}

export const demoCompanies: readonly DemoCompany[] = [
  {
    slug: "tamarack-pike",
    name: "Tamarack & Pike Mechanical",
    people: [
      { name: "Maud Perrigo", email: "maud@tamarackpike.example", role: "supervisor" },
      { name: "Hollis Tarn", email: "hollis@tamarackpike.example", role: "senior" },
      { name: "Ibby Castellan", email: "ibby@tamarackpike.example", role: "technician" },
      { name: "Ransom Lindqvist", email: "ransom@tamarackpike.example", role: "technician" },
      { name: "Wren Okafor", email: "wren@tamarackpike.example", role: "trainee" },
    ],
  },
  {
    slug: "bluestem",
    name: "Bluestem Heat Cooperative",
    people: [
      { name: "Agnes Thorvald", email: "agnes@bluestemheat.example", role: "supervisor" },
      { name: "Sunniva Drake", email: "sunniva@bluestemheat.example", role: "technician" },
    ],
  },
];
