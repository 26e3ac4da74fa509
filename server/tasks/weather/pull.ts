export default defineTask({ meta: { name: 'weather:pull', description: 'Pulls the forecasts that are due.' }, run: () => ({ result: 'nothing due' }) })
