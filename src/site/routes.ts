import { editionFiles } from '../tables/editionFiles.ts';
import { press } from './press.ts';

/** One page for each table of each edition. */
export async function tableRoutes() {
  const pressed = await press();
  return pressed.editions.flatMap((edition) =>
    edition.tables.map((table) => ({
      params: { edition: edition.edition.number, table: table.id },
      props: { press: pressed, pressed: edition, table },
    })),
  );
}

/** One file for each table, for its uncertainties where it has any, and for the milestones of each set. */
export async function csvRoutes() {
  const { editions } = await press();
  return editions.flatMap((pressed) =>
    editionFiles(pressed).map(({ id, csv }) => ({
      params: { edition: pressed.edition.number, file: id },
      props: { csv },
    })),
  );
}

/** One page for each edition. */
export async function editionRoutes() {
  const pressed = await press();
  return pressed.editions.map((edition) => ({
    params: { edition: edition.edition.number },
    props: { press: pressed, pressed: edition },
  }));
}

/** One page for each parameter set of each edition. */
export async function setRoutes() {
  const pressed = await press();
  return pressed.editions.flatMap((edition) =>
    edition.edition.parameterSets.map((set) => ({
      params: { edition: edition.edition.number, set },
      props: { press: pressed, pressed: edition, set },
    })),
  );
}

/** One page for each quantity. */
export async function quantityRoutes() {
  const pressed = await press();
  return pressed.content.quantities.map(({ id }) => ({
    params: { quantity: id },
    props: { press: pressed, quantity: id },
  }));
}
