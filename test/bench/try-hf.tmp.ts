import { catalogueFactory } from '../factories/catalogue-factory';
import { priceListFactory, priceTermsFactory } from '../factories/price-list-factory';
import { lineFactory } from '../factories/line-factory';
import { priceWorkbook } from '../outside/pricing/price-workbook';
const { content } = priceListFactory();
void catalogueFactory;
for (const n of [300, 1000, 3000]) {
  const lines = lineFactory(content, n, 2026).map((l) => ({ ...l, weightKg: '40' }));
  const t = process.cpuUsage(); const w = priceWorkbook(content, priceTermsFactory(), lines, false); const u = process.cpuUsage(t);
  console.log(n, 'lines/s', Math.round(n / ((u.user + u.system) / 1e6)), w.book.getSheetDimensions(w.book.getSheetId('Lines')!));
  w.book.destroy();
}
