import './strict'
