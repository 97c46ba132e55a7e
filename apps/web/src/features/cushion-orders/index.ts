export { NewOrderButton } from './components/new-order-button.tsx';
export { OrderPage } from './components/order-page.tsx';
export { UpholstererPage } from './components/upholsterer-page.tsx';
