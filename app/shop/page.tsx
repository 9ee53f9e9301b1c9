import type { Metadata } from 'next';
import { listShopBatches } from '@/lib/use-cases/batches/list-shop-batches';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';
import { ShopBatches } from './_components/shop-batches';

export const metadata: Metadata = { title: 'Batches for your shop' };

export default async function ShopPage() {
  const { ctx } = await requirePerson(paths.shop());
  return <ShopBatches batches={await listShopBatches(ctx)} />;
}
