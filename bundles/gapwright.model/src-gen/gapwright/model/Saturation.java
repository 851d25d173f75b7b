/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Saturation</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Saturation flux density at a temperature.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Saturation#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.Saturation#getFluxDensity <em>Flux Density</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getSaturation()
 * @model
 * @generated
 */
public interface Saturation extends EObject {
	/**
	 * Returns the value of the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Temperature</em>' attribute.
	 * @see #setTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getSaturation_Temperature()
	 * @model dataType="gapwright.model.Temperature" required="true"
	 * @generated
	 */
	Quantity getTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.Saturation#getTemperature <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Temperature</em>' attribute.
	 * @see #getTemperature()
	 * @generated
	 */
	void setTemperature(Quantity value);

	/**
	 * Returns the value of the '<em><b>Flux Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Flux Density</em>' attribute.
	 * @see #setFluxDensity(Quantity)
	 * @see gapwright.model.GapwrightPackage#getSaturation_FluxDensity()
	 * @model dataType="gapwright.model.FluxDensity" required="true"
	 * @generated
	 */
	Quantity getFluxDensity();

	/**
	 * Sets the value of the '{@link gapwright.model.Saturation#getFluxDensity <em>Flux Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Flux Density</em>' attribute.
	 * @see #getFluxDensity()
	 * @generated
	 */
	void setFluxDensity(Quantity value);

} // Saturation
