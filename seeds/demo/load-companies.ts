import { type Role } from '@shared/contracts/session';
import { minorOf } from '@shared/money/money';
import {
  accountBalances,
  addresses,
  companies,
  exemptionCertificates,
  fabricators,
  people,
  personRoles,
  tradeAccounts,
} from '@api/database/schema/companies';
import { type Db } from '@api/database/open-database';
import { demoDealers } from './dealers';
import { demoFabricators } from './fabricators';

/** The one password of every demo sign-in. */
export const DEMO_PASSWORD = 'made-to-size';

export const tradeAccountId = (dealer: string, maker: string) => `${dealer}.${maker}`;
export const personId = (mailbox: string, company: string) => `${mailbox}.${company}`;

/**
 * Writes the demo companies with their people, trade accounts and ship-to books. Identities
 * are readable and the same in every installation.
 *
 * @param passwordHash of DEMO_PASSWORD
 * @param at UTC epoch ms from which they exist
 */
export function loadCompanies(db: Db, passwordHash: string, at: number): void {
  const person = (company: string, domain: string, mailbox: string, name: string, roles: Role[], orderLimitMinor: number | null = null) => {
    const id = personId(mailbox, company);
    db.insert(people)
      .values({ id, companyId: company, email: `${mailbox}@${domain}`, name, passwordHash, orderLimitMinor, createdAt: at })
      .run();
    for (const role of roles) db.insert(personRoles).values({ personId: id, role }).run();
  };

  db.insert(companies)
    .values({
      id: 'sealyard',
      kind: 'market',
      name: 'Sealyard',
      town: 'Ottery',
      country: 'US',
      emailDomain: 'sealyard.example',
      measureSystem: 'imperial',
      timeZone: 'America/New_York',
      locale: 'en-US',
      letterhead: {
        lines: ['1 Market Yard', 'Ottery, OH 44100'],
        email: 'operator@sealyard.example',
        phone: '+1 555 0100',
        registration: '',
      },
      createdAt: at,
    })
    .run();
  person('sealyard', 'sealyard.example', 'operator', 'Cass Whitlow', ['operator']);

  for (const maker of demoFabricators) {
    db.insert(companies)
      .values({
        id: maker.id,
        kind: 'fabricator',
        name: maker.name,
        town: maker.town,
        country: maker.country,
        emailDomain: maker.domain,
        measureSystem: maker.measureSystem,
        timeZone: maker.timeZone,
        locale: maker.locale,
        letterhead: maker.letterhead,
        createdAt: at,
      })
      .run();
    db.insert(fabricators)
      .values({
        companyId: maker.id,
        about: maker.about,
        plantAltitudeM: maker.plantAltitudeM,
        capabilities: maker.capabilities,
        calendar: maker.calendar,
        numberPrefix: maker.prefix,
      })
      .run();
    person(maker.id, maker.domain, 'sales', maker.people.sales, ['sales']);
    person(maker.id, maker.domain, 'accounts', maker.people.accounts, ['accounts']);
    person(maker.id, maker.domain, 'plant', maker.people.plant, ['plant']);
    person(maker.id, maker.domain, 'admin', maker.people.admin, ['fabricator-admin']);
  }

  for (const dealer of demoDealers) {
    const [firstPlace] = dealer.places;
    db.insert(companies)
      .values({
        id: dealer.id,
        kind: 'dealer',
        name: dealer.name,
        town: dealer.town,
        country: 'US',
        emailDomain: dealer.domain,
        measureSystem: 'imperial',
        timeZone: 'America/New_York',
        locale: 'en-US',
        letterhead: {
          lines: firstPlace ? [firstPlace.line, `${firstPlace.town}, ${firstPlace.region} ${firstPlace.postcode}`] : [],
          email: `hello@${dealer.domain}`,
          phone: '+1 555 0177',
          registration: '',
        },
        createdAt: at,
      })
      .run();
    const limit = dealer.buyerLimit === undefined ? null : minorOf(String(dealer.buyerLimit), 'USD');
    person(dealer.id, dealer.domain, 'buyer', dealer.buyer, ['buyer'], limit);
    person(dealer.id, dealer.domain, 'admin', dealer.admin, ['dealer-admin', 'buyer']);
    dealer.places.forEach((place, position) => {
      db.insert(addresses)
        .values({
          id: `${dealer.id}.place-${position + 1}`,
          companyId: dealer.id,
          label: place.label,
          lines: [place.line],
          town: place.town,
          region: place.region,
          postcode: place.postcode,
          country: 'US',
          jurisdiction: place.jurisdiction,
          zone: place.zone,
          altitudeM: place.altitudeM,
          position,
        })
        .run();
    });
    if (dealer.exempt) {
      db.insert(exemptionCertificates)
        .values({ id: `${dealer.id}.exempt`, dealerId: dealer.id, ...dealer.exempt, validFrom: '2025-01-01', validUntil: '2027-12-31' })
        .run();
    }
    for (const account of dealer.accounts) {
      const maker = demoFabricators.find(({ id }) => id === account.maker)!;
      const id = tradeAccountId(dealer.id, maker.id);
      db.insert(tradeAccounts)
        .values({
          id,
          dealerId: dealer.id,
          fabricatorId: maker.id,
          currency: maker.currency,
          state: 'open',
          tier: account.tier,
          terms: maker.terms,
          limitMinor: minorOf(String(account.limit), maker.currency),
          countsFrom: account.countsFrom ?? 'placement',
          onHold: false,
          // A maker who knows that a dealer pays late gives it longer before it stops its orders.
          graceDays: dealer.paysLate > 8 ? 45 : 15,
          createdAt: at,
        })
        .run();
      db.insert(accountBalances).values({ tradeAccountId: id, receivableMinor: 0, unappliedMinor: 0, reservedMinor: 0 }).run();
    }
  }
}
