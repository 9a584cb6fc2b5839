import * as pricing from '@seamwright/pricing/contracts';
import { ofCustomer, type Row } from '../row';
import { OWN_PRICE_FROM, type Party } from '../testing/party';
import { aDraft, aSentQuote, ORDER_DAY, quoteOf, someLines } from '../testing/trade';
import type { World } from '../testing/world';

/** The line of the customer's own list, as it is now. */
async function ownLine(world: World, { priceListId }: Party) {
  const { items } = await world.deed(world.staff.admin, pricing.listPriceLines, { params: { priceListId } });
  const [line] = items;
  if (!line) throw new Error('The list is empty');
  return line;
}

const readToAnswer = async (world: World, party: Party) => {
  const { id, rowVersion } = await aSentQuote(world, party);
  return { params: { quoteId: id }, ifMatch: rowVersion };
};

export const pricingRows: readonly Row[] = [
  ofCustomer(pricing.checkPrices, (world, { id }) => ({
    body: { customerId: id, deliveryDay: ORDER_DAY, lines: someLines(world) },
  })),
  ofCustomer(
    pricing.listQuotes,
    async (world, party) => {
      await aSentQuote(world, party);
      return { query: { customerId: party.id } };
    },
    'empty',
  ),
  ofCustomer(pricing.getQuote, async (world, party) => ({ params: { quoteId: (await aSentQuote(world, party)).id } })),
  ofCustomer(pricing.createQuote, (world, party) => ({ body: quoteOf(world, party) })),
  ofCustomer(pricing.sendQuote, async (world, party) => {
    const { id, rowVersion } = await aDraft(world, party);
    return { params: { quoteId: id }, ifMatch: rowVersion };
  }),
  ofCustomer(pricing.acceptQuote, readToAnswer),
  ofCustomer(pricing.declineQuote, readToAnswer),
  ofCustomer(pricing.listPriceLists, (_world, { name }) => ({ query: { q: name } }), 'empty'),
  ofCustomer(pricing.getPriceList, (_world, { priceListId }) => ({ params: { priceListId } })),
  ofCustomer(pricing.listPriceLines, (_world, { priceListId }) => ({ params: { priceListId } })),
  ofCustomer(pricing.setPriceLine, async (world, party) => {
    const { id, rowVersion } = await ownLine(world, party);
    const body = { from: OWN_PRICE_FROM, priceMinor: 2_250, breaks: [] };
    return { params: { priceLineId: id }, body, ifMatch: rowVersion };
  }),
];
